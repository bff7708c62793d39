import type { Transporter } from "nodemailer";
import { claimMail } from "./claim-mail.server";
import { mailSender } from "./mail-sender.server";
import { settleCaught, settleFailed, settleSent } from "./settle-mail.server";

interface Options {
  /** Null where no mail server is set. */
  transport: Transporter | null;
  /** Asked before each mail; once true, the rest is left to others. */
  isStopping?: () => boolean;
}

/**
 * Sends what is due, one mail after another, each outside any transaction. Any number of processes may do it side by
 * side. Without a mail server the local mailbox catches all of it.
 * @returns how many mails were tried
 */
export async function sendDueMail({ transport, isStopping = () => false }: Options): Promise<number> {
  if (transport === null) {
    await settleCaught();
    return 0;
  }
  for (let tried = 0; ; tried++) {
    const mail = isStopping() ? undefined : await claimMail();
    if (!mail) return tried;
    try {
      await transport.sendMail({
        from: mailSender(),
        to: mail.toAddress,
        subject: mail.subject,
        text: mail.body,
        messageId: mail.messageId,
      });
    } catch (error) {
      await settleFailed(mail, error);
      continue;
    }
    await settleSent(mail);
  }
}
