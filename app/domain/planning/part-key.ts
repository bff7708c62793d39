/**
 * What makes two part numbers the same: Unicode NFC, trimmed, upper-cased. Compared byte by byte, so
 * `007` and `7`, or `A` and `Á`, are different parts. The typed text is kept for showing.
 */
export function partKey(text: string): string {
  return isPlain(text) ? text : text.normalize("NFC").trim().toUpperCase();
}

/** Printable ASCII without spaces and small letters is its own key: most part numbers, seen without a copy. */
function isPlain(text: string): boolean {
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i);
    if (code <= 0x20 || code > 0x7e || (code >= 0x61 && code <= 0x7a)) return false;
  }
  return true;
}
