import { Op } from "sequelize";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { Person } from "~/db/models/people/person";
import { codeSchema } from "~/schemas/people/account";
import { AppError } from "~/utils/errors";
import { requestAddress } from "~/utils/request-address";
import { parseInput } from "~/utils/request-body";
import { readHalfId, readSessionId } from "~/utils/session-cookie";
import { hashSecret } from "../secret.server";
import { startSession } from "../start-session.server";
import { spendCode } from "./spend-code.server";

/**
 * Signs in somebody who has shown the password, by the code.
 * @returns the id of the new session, for the cookie
 * @throws AppError `unauthenticated` when the password is to be shown again, `invalid` at the field `code`, `too-many`
 */
export async function finishSignIn(headers: Headers, input: unknown): Promise<string> {
  const idHash = hashSecret(readHalfId(headers) ?? "");
  const half = await HalfSignIn.findOne({ where: { idHash, expiresAt: { [Op.gt]: new Date() } } });
  const person = half && (await Person.findOne({ where: { id: half.personId, disabledAt: null } }));
  if (!person) throw passwordFirst();
  const { code } = parseInput(codeSchema, input);
  await spendCode({ personId: person.id, code, address: requestAddress(headers) });
  // Ended meanwhile, by a new password or by another who was quicker: then it counts no more.
  if ((await HalfSignIn.destroy({ where: { idHash } })) === 0) throw passwordFirst();
  return startSession(person.id, readSessionId(headers), headers);
}

function passwordFirst(): AppError {
  return new AppError("unauthenticated", "That took too long. Sign in with your password again.");
}
