import { QueryTypes } from "sequelize";
import { sequelize } from "~/db/client.server";
import { inTransaction } from "~/db/in-transaction.server";
import { readRows } from "~/db/read-rows.server";

export interface ClaimedMail {
  id: number;
  messageId: string;
  toAddress: string;
  subject: string;
  body: string;
  /** This try counted. */
  tries: number;
}

/** Longer than the slowest try, so that a lease ends only where a process has died. */
const LEASE_SECONDS = 180;

/**
 * Takes the mail that is due first and holds it for three minutes; others skip it meanwhile. Raw SQL, since the
 * model cannot say SKIP LOCKED.
 */
export function claimMail(): Promise<ClaimedMail | undefined> {
  return inTransaction(async (transaction) => {
    const [mail] = await readRows<ClaimedMail>(
      `SELECT id, message_id AS messageId, to_address AS toAddress, subject, body, tries + 1 AS tries
         FROM outbox
        WHERE state = 'waiting' AND next_at <= NOW(3) AND (lease_until IS NULL OR lease_until < NOW(3))
        ORDER BY next_at, id LIMIT 1 FOR UPDATE SKIP LOCKED`,
      {},
      transaction,
    );
    if (!mail) return undefined;
    await sequelize.query(
      `UPDATE outbox SET tries = tries + 1, lease_until = NOW(3) + INTERVAL ${LEASE_SECONDS} SECOND WHERE id = :id`,
      { replacements: { id: mail.id }, type: QueryTypes.UPDATE, transaction },
    );
    return { ...mail, id: Number(mail.id), tries: Number(mail.tries) };
  });
}
