import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from "node:crypto";
import { readEnv } from "~/utils/env";

const IV_BYTES = 12;
const TAG_BYTES = 16;

function key(): Buffer {
  const { sessionSecret } = readEnv();
  if (sessionSecret === undefined) throw new Error("SESSION_SECRET is not set; start with npm start.");
  return Buffer.from(hkdfSync("sha256", sessionSecret, "", "cotterpin second factor", 32));
}

/** Encrypts a secret for one person (AES-256-GCM), so that a copy of the database alone is worth nothing. */
export function sealSecret(personId: number, secret: string): string {
  const iv = randomBytes(IV_BYTES);
  const cipher = createCipheriv("aes-256-gcm", key(), iv).setAAD(Buffer.from(String(personId)));
  const sealed = Buffer.concat([cipher.update(secret, "utf8"), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), sealed]).toString("base64url");
}

/**
 * The secret again.
 * @throws Error when it was sealed for somebody else, under another SESSION_SECRET, or changed since
 */
export function openSecret(personId: number, sealed: string): string {
  const bytes = Buffer.from(sealed, "base64url");
  const decipher = createDecipheriv("aes-256-gcm", key(), bytes.subarray(0, IV_BYTES), {
    authTagLength: TAG_BYTES,
  }).setAAD(Buffer.from(String(personId)));
  decipher.setAuthTag(bytes.subarray(IV_BYTES, IV_BYTES + TAG_BYTES));
  const opened = decipher.update(bytes.subarray(IV_BYTES + TAG_BYTES));
  return Buffer.concat([opened, decipher.final()]).toString("utf8");
}
