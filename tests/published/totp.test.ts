import { Secret } from "otpauth";
import { describe, expect, it } from "vitest";
import { matchStep } from "~/services/people/second-factor/match-step";

/** RFC 6238, Appendix B: the test vectors, eight digits; the ASCII secret is repeated to the length of each hash. */
const SECRETS = {
  SHA1: "12345678901234567890",
  SHA256: "12345678901234567890123456789012",
  SHA512: "1234567890123456789012345678901234567890123456789012345678901234",
};

const VECTORS: [number, string, string, string][] = [
  [59, "94287082", "46119246", "90693936"],
  [1111111109, "07081804", "68084774", "25091201"],
  [1111111111, "14050471", "67062674", "99943326"],
  [1234567890, "89005924", "91819424", "93441116"],
  [2000000000, "69279037", "90698825", "38618901"],
  [20000000000, "65353130", "77737706", "47863826"],
];

const base32 = (text: string) => Secret.fromLatin1(text).base32;

describe("codes of RFC 6238, Appendix B", () => {
  it.each(VECTORS)("at %i seconds", (seconds, ...codes) => {
    for (const [at, algorithm] of (["SHA1", "SHA256", "SHA512"] as const).entries()) {
      const shared = { secret: base32(SECRETS[algorithm]), digits: 8 as const, algorithm };
      expect(matchStep(codes[at], shared, seconds * 1000)).toBe(Math.floor(seconds / 30));
      expect(matchStep(codes[(at + 1) % 3], shared, seconds * 1000)).toBeNull();
    }
  });

  it("are good one step early and one step late, and no further", () => {
    const shared = { secret: base32(SECRETS.SHA1) };
    const now = 1111111110_000;
    const step = 37037037;
    // The last six digits of the vector at 1111111111 seconds.
    expect([-2, -1, 0, 1, 2].map((steps) => matchStep("050471", shared, now + steps * 30_000))).toEqual([
      null,
      step,
      step,
      step,
      null,
    ]);
  });
});
