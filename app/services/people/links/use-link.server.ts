import { Op, type Transaction } from "sequelize";
import { Person } from "~/db/models/people/person";
import { PersonLink } from "~/db/models/people/person-link";
import { AppError } from "~/utils/errors";
import { hashSecret } from "../secret.server";
import { type LinkKind, withdrawLinks } from "./make-link.server";

const GONE: Record<LinkKind, string> = {
  invitation: "This invitation does not work any more. Ask the manager to send you another.",
  password: "This link does not work any more. Ask for another from the sign-in page.",
};

/**
 * Uses a link up, and with it the person's others. The update locks its row, so of two who use it at once only one goes on.
 * @returns the person whose link it was, locked
 * @throws AppError `conflict` when the link is unknown, used, withdrawn, too old or its person is disabled
 */
export async function useLink(secret: string, kind: LinkKind, transaction: Transaction): Promise<Person> {
  const linkHash = hashSecret(secret);
  const now = new Date();
  const open = { usedAt: { [Op.is]: null }, withdrawnAt: { [Op.is]: null }, expiresAt: { [Op.gt]: now } };
  const [used] = await PersonLink.update(
    { usedAt: now },
    { where: { linkHash, kind, ...open }, transaction },
  );
  if (used !== 1) throw new AppError("conflict", GONE[kind]);
  const link = await PersonLink.findOne({ where: { linkHash }, transaction, rejectOnEmpty: true });
  const person = await Person.findByPk(link.personId, { transaction, lock: true, rejectOnEmpty: true });
  if (person.disabledAt !== null) throw new AppError("conflict", GONE[kind]);
  await withdrawLinks(person.id, transaction);
  return person;
}
