import { randomUUID } from "node:crypto";
import { assertKey } from "~/services/idempotency/assert-key";
import type { CurrentPerson } from "~/services/people/current-person";
import { type Reversed, reverseMovement } from "~/services/stock/reverse-movement.server";
import { type TellsShipLine, tellShipLine } from "./tell-ship-line.server";

interface ReverseAndTell {
  person: CurrentPerson;
  movementId: number;
  reason: string;
  /** As it was sent; may be left out, since a movement is reversed once anyhow. */
  key: string | null;
}

/** Reverses a movement as `reverseMovement` does and says what has become of the ship line. */
export async function reverseAndTell(reversal: ReverseAndTell): Promise<Reversed & TellsShipLine> {
  const { person, movementId, reason } = reversal;
  const idempotencyKey = reversal.key === null ? randomUUID() : assertKey(reversal.key);
  const actor = { personId: person.id, roles: person.roles };
  return tellShipLine(idempotencyKey, await reverseMovement({ actor, movementId, reason, idempotencyKey }));
}
