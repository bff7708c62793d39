import { Op, type Transaction } from "sequelize";
import { PersonLink } from "~/db/models/people/person-link";
import { hashSecret, newSecret } from "../secret.server";

export type LinkKind = PersonLink["kind"];

const HOUR = 60 * 60 * 1000;
const LIFE: Record<LinkKind, number> = { invitation: 7 * 24 * HOUR, password: HOUR };

/**
 * Makes a link of 256 bits for a person, which works once within seven days (invitation) or an hour (password), and
 * withdraws the ones of its kind before it. Whoever calls has locked the person's row.
 * @returns the secret of the link; only its hash is kept
 */
export async function makeLink(personId: number, kind: LinkKind, transaction: Transaction): Promise<string> {
  await withdrawLinks(personId, transaction, kind);
  const secret = newSecret();
  const expiresAt = new Date(Date.now() + LIFE[kind]);
  await PersonLink.create({ personId, kind, linkHash: hashSecret(secret), expiresAt }, { transaction });
  return secret;
}

/** Makes every link of a person (of this kind, where one is named) that still works worthless. */
export async function withdrawLinks(
  personId: number,
  transaction: Transaction,
  kind?: LinkKind,
): Promise<void> {
  const open = { personId, usedAt: { [Op.is]: null }, withdrawnAt: { [Op.is]: null } };
  const where = kind === undefined ? open : { ...open, kind };
  await PersonLink.update({ withdrawnAt: new Date() }, { where, transaction });
}
