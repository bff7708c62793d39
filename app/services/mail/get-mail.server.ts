import { OutboxMail } from "~/db/models/system/outbox-mail";
import { readEnv } from "~/utils/env";
import { AppError } from "~/utils/errors";
import type { ListedMail } from "./find-mails.server";
import { hideLinks } from "./hide-links";

/**
 * One mail to read. Its one-time links are shown by the local mailbox alone: where a mail server is set they are only
 * for whom the mail went to.
 * @throws AppError `not-found`
 */
export async function getMail(id: number): Promise<ListedMail & { body: string }> {
  const mail = await OutboxMail.findByPk(id);
  if (!mail) throw new AppError("not-found", "There is no mail with this number.");
  const { toAddress, subject, state, tries, fault } = mail;
  const isLocal = readEnv().smtpUrl === undefined && state !== "sent";
  return {
    id,
    to: toAddress,
    subject,
    state,
    tries,
    fault,
    createdAt: mail.createdAt.toISOString(),
    nextAt: mail.nextAt.toISOString(),
    body: isLocal ? mail.body : hideLinks(mail.body),
  };
}
