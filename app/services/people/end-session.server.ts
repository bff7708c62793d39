import { Session } from "~/db/models/people/session";
import { hashSecret } from "./secret.server";

/** Ends a session; its cookie is worth nothing from then on. */
export async function endSession(id: string): Promise<void> {
  await Session.destroy({ where: { idHash: hashSecret(id) } });
}
