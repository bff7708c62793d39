import { Secret } from "otpauth";
import { inTransaction } from "~/db/in-transaction.server";
import { SecondFactor } from "~/db/models/people/second-factor";
import { AppError } from "~/utils/errors";
import { ownId } from "../account/own-id";
import type { CurrentPerson } from "../current-person";
import { sealSecret } from "./seal-secret.server";

const SECRET_BYTES = 20;

/**
 * Makes a secret for one's authenticator; it does not count before `confirmSecondFactor`.
 * @throws AppError `conflict` when one is on already
 */
export async function beginSecondFactor(person: CurrentPerson): Promise<void> {
  const personId = ownId(person);
  const { base32 } = new Secret({ size: SECRET_BYTES });
  await inTransaction(async (transaction) => {
    const there = await SecondFactor.findByPk(personId, { transaction, lock: true });
    if (there?.confirmedAt) throw new AppError("conflict", "The second factor is on already.");
    await there?.destroy({ transaction });
    await SecondFactor.create({ personId, sealedSecret: sealSecret(personId, base32) }, { transaction });
  });
}
