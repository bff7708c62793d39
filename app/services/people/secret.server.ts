import { createHash, randomBytes } from "node:crypto";

/** A new 256-bit secret, in 43 characters that go anywhere. */
export function newSecret(): string {
  return randomBytes(32).toString("base64url");
}

/** What is kept of a secret: its SHA-256 in 64 hexadecimal digits, enough since the secret is random and long. */
export function hashSecret(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}
