/** Where Enter leads: to the one thing that is called so, else to the list of what was found. */
export function findAddress(typed: string): string {
  return `/find?go=1&q=${encodeURIComponent(typed.trim())}`;
}
