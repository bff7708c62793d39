import { hashSecret } from "./secret.server";

/** The hash of a set-up code however it is typed: small letters, blanks and dashes make no difference. */
export function hashSetupCode(code: string): string {
  return hashSecret(code.toUpperCase().replace(/[^A-Z0-9]/g, ""));
}
