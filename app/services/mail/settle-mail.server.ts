import { QueryTypes } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { ClaimedMail } from "./claim-mail.server";
import { hideLinks } from "./hide-links";

const MOST_TRIES = 8;
const FIRST_WAIT_SECONDS = 60;
const LONGEST_WAIT_SECONDS = 3600;

/** Writes down that the server took the mail; what of it is kept no longer holds its links. */
export async function settleSent({ id, body }: ClaimedMail): Promise<void> {
  await update(
    "UPDATE outbox SET state = 'sent', ended_at = NOW(3), lease_until = NULL, fault = NULL, body = :body WHERE id = :id AND state = 'waiting'",
    { id, body: hideLinks(body) },
  );
}

/**
 * Writes down a try that failed: the next after 1, 2, 4 … minutes, at most an hour; after the eighth there is none.
 * A lease that somebody else holds by now is left alone.
 */
export async function settleFailed({ id, tries }: ClaimedMail, error: unknown): Promise<void> {
  const seconds = Math.min(FIRST_WAIT_SECONDS * 2 ** (tries - 1), LONGEST_WAIT_SECONDS);
  const state = tries >= MOST_TRIES ? "dead" : "waiting";
  await update(
    `UPDATE outbox SET state = :state, ended_at = IF(:state = 'dead', NOW(3), NULL), lease_until = NULL, fault = :fault,
            next_at = NOW(3) + INTERVAL ${seconds} SECOND
      WHERE id = :id AND state = 'waiting' AND tries = :tries`,
    { id, tries, state, fault: faultOf(error) },
  );
}

/** Hands every due mail to the local mailbox: there is no mail server to send it to. */
export async function settleCaught(): Promise<void> {
  await update(
    `UPDATE outbox SET state = 'caught', ended_at = NOW(3), lease_until = NULL
      WHERE state = 'waiting' AND next_at <= NOW(3) AND (lease_until IS NULL OR lease_until < NOW(3))`,
    {},
  );
}

function faultOf(error: unknown): string {
  const text = error instanceof Error ? error.message : "No reason was given.";
  return text.replace(/\s+/g, " ").trim().slice(0, 255);
}

async function update(statement: string, replacements: Record<string, unknown>): Promise<void> {
  await sequelize.query(statement, { replacements, type: QueryTypes.UPDATE });
}
