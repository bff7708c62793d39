import type { Transaction } from "sequelize";
import { queueMail } from "~/services/mail/queue-mail.server";
import { ownAddress } from "~/utils/own-address";
import { makeLink } from "./make-link.server";

interface Invited {
  id: number;
  name: string;
  email: string;
}

/** Makes an invitation for a person and puts its mail into the outbox. */
export async function mailInvitation(
  { id, name, email }: Invited,
  inviter: string,
  transaction: Transaction,
): Promise<void> {
  const secret = await makeLink(id, "invitation", transaction);
  const body = `Hello ${name},

${inviter} has made a place for you in Cotterpin, the stockroom program.
Choose your password here and you are in:

${ownAddress()}/welcome/${secret}

The link works once, within seven days. If you did not expect this mail, leave it: nothing happens.
`;
  await queueMail({ to: email, subject: "Your place in Cotterpin", body }, transaction);
}
