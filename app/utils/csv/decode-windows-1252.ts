/** What Windows-1252 has at 0x80 to 0x9f; the five bytes it leaves free stay as they are. */
const high = "€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ";

/** Node's own decoder takes these bytes for Latin-1, where 0x80 is a control character and no euro sign. */
export function decodeWindows1252(bytes: Uint8Array): string {
  const text = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString("latin1");
  return text.replaceAll(/[\u0080-\u009f]/g, (sign) => high[sign.charCodeAt(0) - 0x80]);
}
