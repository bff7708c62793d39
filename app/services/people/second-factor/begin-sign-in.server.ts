import { Op } from "sequelize";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { SecondFactor } from "~/db/models/people/second-factor";
import { hashSecret, newSecret } from "../secret.server";

const FIVE_MINUTES = 5 * 60 * 1000;

/**
 * After the right password: whether a code is owed as well.
 * @returns the id of the half sign-in, for its cookie; null for somebody without a second factor
 */
export async function beginSignIn(personId: number): Promise<string | null> {
  const now = Date.now();
  const isOn = await SecondFactor.count({ where: { personId, confirmedAt: { [Op.not]: null } } });
  if (isOn === 0) return null;
  const id = newSecret();
  await HalfSignIn.destroy({ where: { expiresAt: { [Op.lt]: new Date(now) } } });
  await HalfSignIn.create({ idHash: hashSecret(id), personId, expiresAt: new Date(now + FIVE_MINUTES) });
  return id;
}
