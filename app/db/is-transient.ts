const TRANSIENT_NUMBERS = new Set([
  1213, // deadlock
  1205, // lock wait timeout
  1020, // record has changed since last read
  1927, // connection was killed
  2006, // server has gone away
  2013, // lost connection during query
]);
const LOST_CONNECTION =
  /^(ECONNRESET|EPIPE|ETIMEDOUT|ECONNREFUSED|PROTOCOL_CONNECTION_LOST|ER_SOCKET_\w+|ER_CMD_CONNECTION_CLOSED|ER_CONNECTION_\w+|ER_SERVER_SHUTDOWN|ER_TOO_MANY_CONNECTIONS|ER_CON_COUNT_ERROR)$/;
const CONNECTION_ERRORS = new Set([
  "SequelizeConnectionError",
  "SequelizeConnectionRefusedError",
  "SequelizeConnectionTimedOutError",
  "SequelizeConnectionAcquireTimeoutError",
]);

interface DatabaseFault {
  name?: string;
  errno?: number;
  code?: string;
  parent?: DatabaseFault;
}

/** Whether the whole transaction may succeed when it is done again from its start. */
export function isTransient(error: unknown): boolean {
  if (typeof error !== "object" || error === null) return false;
  const fault = error as DatabaseFault;
  const cause = fault.parent ?? fault;
  return (
    (cause.errno !== undefined && TRANSIENT_NUMBERS.has(cause.errno)) ||
    (cause.code !== undefined && LOST_CONNECTION.test(cause.code)) ||
    (fault.name !== undefined && CONNECTION_ERRORS.has(fault.name))
  );
}
