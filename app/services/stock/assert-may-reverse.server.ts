import type { Transaction } from "sequelize";
import { mayDo } from "~/services/people/permissions";
import { AppError } from "~/utils/errors";
import { rolesNow } from "./roles-now.server";
import type { StockActor } from "./stock-actor";

/**
 * Asks the right to reverse: who made the movement, on the day (UTC) on which it was entered; the manager always.
 * @throws AppError "forbidden"
 */
export async function assertMayReverse(
  actor: StockActor,
  movement: { id: number; personId: number | null; enteredAt: Date },
  transaction: Transaction,
): Promise<void> {
  const roles = await rolesNow(actor, transaction);
  if (roles.includes("manager")) return;
  const own = actor.personId !== null && movement.personId === actor.personId;
  const today = new Date().toISOString().slice(0, 10) === movement.enteredAt.toISOString().slice(0, 10);
  if (own && today && mayDo(roles, "reverse-movement")) return;
  const message = `Movement ${movement.id} is reversed by who made it, the same day, or by the manager.`;
  throw new AppError("forbidden", message);
}
