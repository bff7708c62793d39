import { Secret, TOTP } from "otpauth";

const PERIOD = 30;

interface Shared {
  /** In base32, as people type it. */
  secret: string;
  digits?: 6 | 8;
  algorithm?: "SHA1" | "SHA256" | "SHA512";
}

/**
 * The 30-second step (RFC 6238) whose code this is: the present one or one beside it, for clocks that are a little off.
 * @param now milliseconds since 1970
 * @returns null where it is none of them
 */
export function matchStep(
  code: string,
  { secret, digits = 6, algorithm = "SHA1" }: Shared,
  now: number,
): number | null {
  const totp = new TOTP({ secret: Secret.fromBase32(secret), digits, algorithm, period: PERIOD });
  const delta = totp.validate({ token: code, timestamp: now, window: 1 });
  return delta === null ? null : Math.floor(now / 1000 / PERIOD) + delta;
}
