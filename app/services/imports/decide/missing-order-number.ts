const longestNumber = 64;

/** FNV-1a, 32 bits: enough to keep two cut part numbers apart. */
function shortHash(text: string): string {
  let hash = 0x811c9dc5;
  for (const byte of new TextEncoder().encode(text)) hash = Math.imul(hash ^ byte, 0x01000193);
  return (hash >>> 0).toString(16).padStart(8, "0");
}

/** The number of an open order that came without one: the nth of its part, the same whenever it comes again. */
export function missingOrderNumber(partKey: string, nth: number): string {
  const end = `-${nth}`;
  const number = `OPEN-${partKey}${end}`;
  if (number.length <= longestNumber) return number;
  const hash = `-${shortHash(partKey)}`;
  return `OPEN-${partKey.slice(0, longestNumber - 5 - hash.length - end.length)}${hash}${end}`;
}
