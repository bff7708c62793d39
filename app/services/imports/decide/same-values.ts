/** Whether two plain records say the same in every field of the second. */
export function sameValues(before: object | null, after: object | null): boolean {
  if (before === null || after === null) return before === after;
  const known = new Map<string, unknown>(Object.entries(before));
  return Object.entries(after).every(
    ([field, value]) => JSON.stringify(known.get(field)) === JSON.stringify(value),
  );
}
