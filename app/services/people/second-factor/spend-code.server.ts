import { Op } from "sequelize";
import { RecoveryCode } from "~/db/models/people/recovery-code";
import { SecondFactor } from "~/db/models/people/second-factor";
import { AppError } from "~/utils/errors";
import { countAttempt, forgiveAttempt } from "../count-attempt.server";
import { hashSetupCode } from "../hash-setup-code.server";
import { matchStep } from "./match-step";
import { openSecret } from "./seal-secret.server";

interface Shown {
  personId: number;
  /** From the authenticator, or a recovery code. */
  code: string;
  /** Where from: tries count like those of passwords. */
  address: string;
}

/**
 * Uses a code up: none counts twice, whoever shows it and however many at once.
 * @throws AppError `invalid` at the field `code`, `too-many`
 */
export async function spendCode({ personId, code, address }: Shown): Promise<void> {
  const attempt = await countAttempt({ account: `code of person ${personId}`, address });
  const plain = code.replace(/[\s-]/g, "");
  const fits = /^\d{6}$/.test(plain)
    ? await spendStep(personId, plain)
    : await spendRecovery(personId, plain);
  if (!fits) {
    const message = "This is not the code, or it was used already. Wait for the next one and type that.";
    throw new AppError("invalid", message, { errors: [{ field: "code", message }] });
  }
  await forgiveAttempt(attempt);
}

async function spendStep(personId: number, code: string): Promise<boolean> {
  const factor = await SecondFactor.findOne({ where: { personId, confirmedAt: { [Op.not]: null } } });
  if (!factor) return false;
  const step = matchStep(code, { secret: openSecret(personId, factor.sealedSecret) }, Date.now());
  if (step === null) return false;
  // Guarded by the step itself, so of two who show the same code at once only one goes on.
  const where = { personId, sealedSecret: factor.sealedSecret, lastStep: { [Op.lt]: step } };
  const [used] = await SecondFactor.update({ lastStep: step }, { where });
  return used === 1;
}

async function spendRecovery(personId: number, code: string): Promise<boolean> {
  const where = { personId, codeHash: hashSetupCode(code), usedAt: null };
  const [used] = await RecoveryCode.update({ usedAt: new Date() }, { where });
  return used === 1;
}
