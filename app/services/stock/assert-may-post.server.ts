import type { Transaction } from "sequelize";
import type { PostedKind } from "~/domain/stock/types";
import type { Act } from "~/schemas/people/act";
import { ROLE_NAMES } from "~/schemas/people/role";
import { mayDo, whoMay } from "~/services/people/permissions";
import { AppError } from "~/utils/errors";
import { rolesNow } from "./roles-now.server";
import type { StockActor } from "./stock-actor";

/** The acts of which one is needed for each kind. */
const ACTS: Readonly<Record<PostedKind, readonly Act[]>> = {
  receive: ["receive"],
  return: ["pick", "receive"],
  issue: ["pick"],
  scrap: ["scrap", "pick"],
  move: ["move"],
  hold: ["hold"],
  release: ["release-hold"],
  adjust: ["adjust"],
};

/**
 * Asks the right to post inside the transaction, so that a role taken away a moment ago counts.
 * @throws AppError "forbidden", "unauthenticated" for a person who was disabled
 */
export async function assertMayPost(
  actor: StockActor,
  kinds: readonly PostedKind[],
  transaction: Transaction,
): Promise<void> {
  const roles = await rolesNow(actor, transaction);
  const refused = [...new Set(kinds)].find((kind) => !ACTS[kind].some((act) => mayDo(roles, act)));
  if (refused === undefined) return;
  const allowed = [...new Set(ACTS[refused].flatMap(whoMay))].map((role) => ROLE_NAMES[role]);
  throw new AppError("forbidden", `A movement of kind ${refused} is posted by the ${allowed.join(" or ")}.`);
}
