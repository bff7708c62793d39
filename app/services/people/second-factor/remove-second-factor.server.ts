import type { Transaction } from "sequelize";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { RecoveryCode } from "~/db/models/people/recovery-code";
import { SecondFactor } from "~/db/models/people/second-factor";

/** Takes a person's second factor away, with its recovery codes and whoever waits at its door. */
export async function removeSecondFactor(personId: number, transaction: Transaction): Promise<boolean> {
  const removed = await SecondFactor.destroy({ where: { personId }, transaction });
  await RecoveryCode.destroy({ where: { personId }, transaction });
  await HalfSignIn.destroy({ where: { personId }, transaction });
  return removed > 0;
}
