import { randomInt } from "node:crypto";
import { inTransaction } from "~/db/in-transaction.server";
import { SetupCode } from "~/db/models/people/setup-code";
import { hasManager } from "./has-manager.server";
import { hashSetupCode } from "./hash-setup-code.server";

/** Without letters and digits that look alike. */
const ALPHABET = "ABCDEFGHJKMNPQRSTUVWXYZ23456789";

const SEVEN_DAYS = 7 * 24 * 60 * 60 * 1000;

/**
 * Makes the one-time code by which the first visitor becomes the manager; a code made before is worth nothing then.
 * @returns the code, of which only the hash is kept; null once there is a manager
 */
export async function makeSetupCode(): Promise<string | null> {
  return inTransaction(async (transaction) => {
    if (await hasManager(transaction)) return null;
    const letters = Array.from({ length: 16 }, () => ALPHABET[randomInt(ALPHABET.length)]).join("");
    const code = (letters.match(/.{4}/g) ?? []).join("-");
    await SetupCode.destroy({ where: { usedAt: null }, transaction });
    const expiresAt = new Date(Date.now() + SEVEN_DAYS);
    await SetupCode.create({ codeHash: hashSetupCode(code), expiresAt }, { transaction });
    return code;
  });
}
