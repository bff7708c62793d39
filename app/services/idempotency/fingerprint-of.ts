import { createHash } from "node:crypto";

/** SHA-256 of content in canonical form, in hexadecimal: the same content has the same fingerprint. */
export function fingerprintOf(content: unknown): string {
  return createHash("sha256").update(JSON.stringify(content)).digest("hex");
}
