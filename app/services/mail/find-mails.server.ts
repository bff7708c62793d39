import type { OutboxMail } from "~/db/models/system/outbox-mail";
import { readRows } from "~/db/read-rows.server";
import { readEnv } from "~/utils/env";

export interface ListedMail {
  id: number;
  to: string;
  subject: string;
  state: OutboxMail["state"];
  tries: number;
  /** ISO moments: when it was written, when the next try is. */
  createdAt: string;
  nextAt: string;
  fault: string | null;
}

interface MailPage {
  mails: ListedMail[];
  /** Goes on below this number; null at the end. */
  next: number | null;
  /** A mail server is set; else the local mailbox catches all mail. */
  hasServer: boolean;
}

interface Row extends Omit<ListedMail, "createdAt" | "nextAt"> {
  createdAt: Date;
  nextAt: Date;
}

const PAGE = 50;

/** The mails of the outbox, newest first, below a number where one is given. */
export async function findMails(below: number | null = null): Promise<MailPage> {
  const rows = await readRows<Row>(
    `SELECT id, to_address AS \`to\`, subject, state, tries, created_at AS createdAt, next_at AS nextAt, fault
       FROM outbox WHERE :below IS NULL OR id < :below ORDER BY id DESC LIMIT ${PAGE + 1}`,
    { below },
  );
  const mails = rows.slice(0, PAGE).map(presentMail);
  const next = rows.length > PAGE ? (mails.at(-1)?.id ?? null) : null;
  return { mails, next, hasServer: readEnv().smtpUrl !== undefined };
}

function presentMail({ createdAt, nextAt, ...row }: Row): ListedMail {
  return {
    ...row,
    id: Number(row.id),
    tries: Number(row.tries),
    createdAt: new Date(createdAt).toISOString(),
    nextAt: new Date(nextAt).toISOString(),
  };
}
