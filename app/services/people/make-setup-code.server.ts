import { randomInt } from "node:crypto";
import { inTransaction } from "~/db/in-transaction.server";
import { hasManager } from "./has-manager.server";
import { hashSetupCode } from "./hash-setup-code.server";
import { insert, run } from "./run-sql.server";

/** Without letters and digits that look alike. */
const ALPHABET = "ABCDEFGHJKMNPQRSTUVWXYZ23456789";

/**
 * Makes the one-time code by which the first visitor becomes the manager; a code made before is worth nothing then.
 * @returns the code, of which only the hash is kept; null once there is a manager
 */
export async function makeSetupCode(): Promise<string | null> {
  return inTransaction(async (transaction) => {
    if (await hasManager(transaction)) return null;
    const letters = Array.from({ length: 16 }, () => ALPHABET[randomInt(ALPHABET.length)]).join("");
    const code = (letters.match(/.{4}/g) ?? []).join("-");
    await run("DELETE FROM setup_code WHERE used_at IS NULL", {}, transaction);
    await insert(
      "INSERT INTO setup_code (code_hash, expires_at) VALUES (:hash, NOW(3) + INTERVAL 7 DAY)",
      { hash: hashSetupCode(code) },
      transaction,
    );
    return code;
  });
}
