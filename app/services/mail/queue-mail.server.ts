import { randomUUID } from "node:crypto";
import type { Transaction } from "sequelize";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import { ownAddress } from "~/utils/own-address";

interface Mail {
  /** One address, as `emailSchema` leaves it. */
  to: string;
  subject: string;
  /** Plain text. */
  body: string;
}

/**
 * Puts a mail into the outbox, within the transaction of the act that it tells of: either both are kept or neither.
 * Its Message-ID is fixed here, so that one sent twice after a failure can be known.
 * @returns the mail's id
 */
export async function queueMail({ to, subject, body }: Mail, transaction: Transaction): Promise<number> {
  const messageId = `<${randomUUID()}@${new URL(ownAddress()).hostname}>`;
  const mail = { messageId, toAddress: to, subject: subject.slice(0, 255), body };
  return (await OutboxMail.create(mail, { transaction })).id;
}
