import { randomInt } from "node:crypto";
import { inTransaction } from "~/db/in-transaction.server";
import { RecoveryCode } from "~/db/models/people/recovery-code";
import { SecondFactor } from "~/db/models/people/second-factor";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { ownId } from "../account/own-id";
import { countAttempt, forgiveAttempt } from "../count-attempt.server";
import type { CurrentPerson } from "../current-person";
import { hashSetupCode } from "../hash-setup-code.server";
import { matchStep } from "./match-step";
import { openSecret } from "./seal-secret.server";

/** Without letters and digits that look alike. */
const ALPHABET = "ABCDEFGHJKMNPQRSTUVWXYZ23456789";

const RECOVERY_CODES = 10;

/**
 * Switches one's second factor on, by a code that shows that the authenticator has the secret.
 * @returns ten recovery codes, shown once; only their hashes are kept
 * @throws AppError `invalid` at the field `code`, `conflict` when none has begun, `too-many`
 */
export async function confirmSecondFactor(
  code: string,
  person: CurrentPerson,
  address: string,
): Promise<string[]> {
  const personId = ownId(person);
  const attempt = await countAttempt({ account: `code of person ${personId}`, address });
  const codes = Array.from({ length: RECOVERY_CODES }, makeCode);
  await inTransaction(async (transaction) => {
    const factor = await SecondFactor.findByPk(personId, { transaction, lock: true });
    if (!factor || factor.confirmedAt) throw new AppError("conflict", "Begin again: load the page.");
    const secret = openSecret(personId, factor.sealedSecret);
    const step = matchStep(code.replace(/\s/g, ""), { secret }, Date.now());
    if (step === null) {
      const message = "This is not the code that belongs to the picture. Type the one shown now.";
      throw new AppError("invalid", message, { errors: [{ field: "code", message }] });
    }
    await factor.update({ confirmedAt: new Date(), lastStep: step }, { transaction });
    await RecoveryCode.destroy({ where: { personId }, transaction });
    for (const one of codes)
      await RecoveryCode.create({ personId, codeHash: hashSetupCode(one) }, { transaction });
    await appendAuditEvent(
      { actorId: personId, act: "own-account", subject: `person ${personId}`, after: { secondFactor: "on" } },
      transaction,
    );
  });
  await forgiveAttempt(attempt);
  return codes;
}

/** About 79 bits, in four groups. */
function makeCode(): string {
  const letters = Array.from({ length: 16 }, () => ALPHABET[randomInt(ALPHABET.length)]).join("");
  return (letters.match(/.{4}/g) ?? []).join("-");
}
