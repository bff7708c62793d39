/** A connection of the driver, as far as the self-check needs it. */
export interface RawConnection {
  query(sql: string): Promise<unknown>;
}

const PROBE = `SELECT CAST('12345678901234.567890' AS DECIMAL(20,6)) AS exact_decimal,
  CAST(9007199254740991 AS SIGNED) AS big_integer,
  JSON_OBJECT('quantity', '0.350', 'count', 3) AS json_value,
  CAST('2026-03-29 01:30:00.125' AS DATETIME(3)) AS moment,
  CAST('2026-03-29' AS DATE) AS calendar_date`;

const EXPECTED: Record<string, unknown> = {
  exact_decimal: "12345678901234.567890",
  big_integer: 9007199254740991,
  json_value: { quantity: "0.350", count: 3 },
  moment: "2026-03-29T01:30:00.125Z",
  calendar_date: "2026-03-29",
};

/**
 * Reads known values through the driver, because a wrongly configured one changes decimals in silence.
 * @throws Error one sentence naming the kinds of value that came back changed.
 */
export async function assertDriverIsExact(connection: RawConnection): Promise<void> {
  const rows = (await connection.query(PROBE)) as Record<string, unknown>[];
  const changed = Object.keys(EXPECTED).filter((column) => !isSame(rows[0]?.[column], EXPECTED[column]));
  if (changed.length === 0) return;
  const kinds = changed.map((column) => column.replace("_", " ")).join(", ");
  throw new Error(
    `The database driver changes values on their way (${kinds}), so nothing was started: restore the driver versions and options that belong to this release.`,
  );
}

function isSame(actual: unknown, expected: unknown): boolean {
  if (typeof expected === "object") {
    const value = typeof actual === "string" ? JSON.parse(actual) : actual;
    return JSON.stringify(value) === JSON.stringify(expected);
  }
  return (actual instanceof Date ? actual.toISOString() : actual) === expected;
}
