/** What a label says of itself, by the data identifiers of ANSI MH10.8.2 that a stockroom meets. */
export type ScannedLabel = Partial<Record<LabelField, string>>;

export type LabelField = "part" | "lot" | "serial" | "bin" | "order" | "quantity";

/** ANSI MH10.8.2, written down from memory; longer identifiers before those that they end with. */
const IDENTIFIERS: readonly [string, LabelField][] = [
  ["1T", "lot"],
  ["1L", "bin"],
  ["P", "part"],
  ["S", "serial"],
  ["L", "bin"],
  ["K", "order"],
  ["Q", "quantity"],
];

const GROUP = "\u001d";
/** ISO/IEC 15434: opens a message; format 06 holds data identifiers. */
const OPENING = "[)>\u001e06\u001d";
/** Closes the format; what stands behind it closes the message. */
const RECORD = "\u001e";

/**
 * The fields of a scanned label: an ISO/IEC 15434 message in format 06, or one field alone such as `PHB-2041`.
 * Fields with other identifiers are left out, and of a repeated one the first counts. Null where nothing is left.
 */
export function parseScannedLabel(text: string): ScannedLabel | null {
  const fields = text.startsWith(OPENING) ? text.slice(OPENING.length).split(RECORD)[0].split(GROUP) : [text];
  const label: ScannedLabel = {};
  for (const field of fields) {
    const read = readField(field.trim());
    if (read !== null) label[read.name] ??= read.value;
  }
  return Object.keys(label).length > 0 ? label : null;
}

function readField(field: string): { name: LabelField; value: string } | null {
  const known = IDENTIFIERS.find(([identifier]) => field.startsWith(identifier));
  if (known === undefined) return null;
  const value = field.slice(known[0].length).trim();
  return value === "" ? null : { name: known[1], value };
}
