/** The day it is, as an ISO date in UTC, so that server and browser agree. */
export function currentDay(): string {
  return new Date().toISOString().slice(0, 10);
}
