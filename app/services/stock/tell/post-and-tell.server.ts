import type { MovementRequest } from "~/domain/stock/types";
import { assertKey } from "~/services/idempotency/assert-key";
import type { CurrentPerson } from "~/services/people/current-person";
import { type Posted, postMovements } from "~/services/stock/post-movements.server";
import { type TellsShipLine, tellShipLine } from "./tell-ship-line.server";

interface PostAndTell {
  person: CurrentPerson;
  /** As it was sent. */
  key: string | null;
  movements: readonly MovementRequest[];
}

/** Posts movements as `postMovements` does and says what has become of the ship line. */
export async function postAndTell({ person, key, movements }: PostAndTell): Promise<Posted & TellsShipLine> {
  const idempotencyKey = assertKey(key);
  const actor = { personId: person.id, roles: person.roles };
  return tellShipLine(idempotencyKey, await postMovements({ actor, idempotencyKey, movements }));
}
