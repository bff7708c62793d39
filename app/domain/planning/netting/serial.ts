/** A serial as text before its last digits, and those digits. */
export interface Serial {
  prefix: string;
  number: number;
  width: number;
}

/** `SC-098` is `SC-` and 98 in three digits. Null without digits at the end, or with more than fifteen. */
export function parseSerial(text: string): Serial | null {
  const match = /^(.*?)(\d{1,15})$/.exec(text);
  if (!match || /\d$/.test(match[1])) return null;
  return { prefix: match[1], number: Number(match[2]), width: match[2].length };
}

/** True where `serial` is not before `from` and not after `to`; both ends belong, null leaves one open. */
export function serialWithin(serial: Serial, from: string | null, to: string | null): boolean {
  return (from === null || compareTo(serial, from) >= 0) && (to === null || compareTo(serial, to) <= 0);
}

/** Serials of one prefix compare by number, others byte by byte. */
function compareTo(serial: Serial, bound: string): number {
  const other = parseSerial(bound);
  if (other && other.prefix === serial.prefix) return serial.number - other.number;
  const text = serial.prefix + String(serial.number).padStart(serial.width, "0");
  return text < bound ? -1 : text > bound ? 1 : 0;
}
