/**
 * What makes two part numbers the same: Unicode NFC, trimmed, upper-cased. Compared byte by byte, so
 * `007` and `7`, or `A` and `Á`, are different parts. The typed text is kept for showing.
 */
export function partKey(text: string): string {
  return text.normalize("NFC").trim().toUpperCase();
}
