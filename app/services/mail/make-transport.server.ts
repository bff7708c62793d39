import { createTransport, type Transporter } from "nodemailer";

/** A way to the mail server that gives up soon: 5 s to connect and to be greeted, 20 s for each answer. */
export function makeTransport(smtpUrl: string): Transporter {
  return createTransport({
    url: smtpUrl,
    connectionTimeout: 5_000,
    greetingTimeout: 5_000,
    socketTimeout: 20_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}
