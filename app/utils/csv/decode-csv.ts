import type { CsvProblem } from "./csv-problem";
import { decodeWindows1252 } from "./decode-windows-1252";

export type CsvEncoding = "UTF-8" | "UTF-8 with BOM" | "UTF-16LE" | "UTF-16BE" | "Windows-1252";

type Decoded = { ok: true; text: string; encoding: CsvEncoding } | { ok: false; problem: CsvProblem };

function startsWith(bytes: Uint8Array, ...mark: number[]): boolean {
  return mark.every((byte, index) => bytes[index] === byte);
}

function guess(bytes: Uint8Array): { encoding: CsvEncoding; label: string } {
  if (startsWith(bytes, 0xef, 0xbb, 0xbf)) return { encoding: "UTF-8 with BOM", label: "utf-8" };
  if (startsWith(bytes, 0xff, 0xfe)) return { encoding: "UTF-16LE", label: "utf-16le" };
  if (startsWith(bytes, 0xfe, 0xff)) return { encoding: "UTF-16BE", label: "utf-16be" };
  return { encoding: "UTF-8", label: "utf-8" };
}

function decodeStrictly(bytes: Uint8Array, label: string): string | null {
  try {
    return new TextDecoder(label, { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

function fileProblem(found: string, expected: string): Decoded {
  return { ok: false, problem: { line: null, column: null, value: null, found, expected } };
}

/** Bytes of a CSV file to text, with the encoding that was recognised. Byte order marks are taken off. */
export function decodeCsv(bytes: Uint8Array): Decoded {
  if (startsWith(bytes, 0x50, 0x4b, 0x03, 0x04)) {
    return fileProblem("a packed spreadsheet or archive", "a CSV file; save the sheet as CSV first");
  }
  const { encoding, label } = guess(bytes);
  const text = decodeStrictly(bytes, label);
  if (text !== null) return { ok: true, text, encoding };
  if (encoding !== "UTF-8") {
    return fileProblem(
      `bytes that are not ${encoding}, as its first bytes promise`,
      "a whole, undamaged file",
    );
  }
  return { ok: true, text: decodeWindows1252(bytes), encoding: "Windows-1252" };
}
