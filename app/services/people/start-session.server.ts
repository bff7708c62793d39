import { inTransaction } from "~/db/in-transaction.server";
import { insert, run } from "./run-sql.server";
import { hashSecret, newSecret } from "./secret.server";

/**
 * Begins a session under a new id and ends the one the browser had, so that an id planted before never counts.
 * @returns the id for the cookie; only its hash is kept
 */
export async function startSession(personId: number, oldId: string | null): Promise<string> {
  const id = newSecret();
  await inTransaction(async (transaction) => {
    await run(
      "DELETE FROM session WHERE id_hash = :old OR expires_at < NOW(3)",
      { old: hashSecret(oldId ?? "") },
      transaction,
    );
    await insert(
      "INSERT INTO session (id_hash, person_id, expires_at) VALUES (:hash, :personId, NOW(3) + INTERVAL 7 DAY)",
      { hash: hashSecret(id), personId },
      transaction,
    );
  });
  return id;
}
