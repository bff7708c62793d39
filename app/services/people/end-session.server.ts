import { run } from "./run-sql.server";
import { hashSecret } from "./secret.server";

/** Ends a session; its cookie is worth nothing from then on. */
export async function endSession(id: string): Promise<void> {
  await run("DELETE FROM session WHERE id_hash = :hash", { hash: hashSecret(id) });
}
