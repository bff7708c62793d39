import { Op } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { Session } from "~/db/models/people/session";
import { requestAddress } from "~/utils/request-address";
import { nameBrowser } from "./name-browser";
import { hashSecret, newSecret } from "./secret.server";

const SEVEN_DAYS = 7 * 24 * 60 * 60 * 1000;

/**
 * Begins a session under a new id and ends the one the browser had, so that an id planted before never counts.
 * @param headers of the request, for the list of sessions: browser and address
 * @returns the id for the cookie; only its hash is kept
 */
export async function startSession(
  personId: number,
  oldId: string | null,
  headers: Headers = new Headers(),
): Promise<string> {
  const id = newSecret();
  const now = Date.now();
  await inTransaction(async (transaction) => {
    const ended = [{ idHash: hashSecret(oldId ?? "") }, { expiresAt: { [Op.lt]: new Date(now) } }];
    await Session.destroy({ where: { [Op.or]: ended }, transaction });
    const expiresAt = new Date(now + SEVEN_DAYS);
    const browser = nameBrowser(headers.get("User-Agent"));
    const address = requestAddress(headers);
    await Session.create({ idHash: hashSecret(id), personId, browser, address, expiresAt }, { transaction });
  });
  return id;
}
