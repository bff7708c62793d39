import type { OrderableKit } from "~/schemas/kit-orders/presented-kit-order";
import type { BookChangeInput } from "~/schemas/planning/effects";
import type { KitOrderDraft } from "./kit-order-draft";

/**
 * What saving the form would change, for the line above its button; null while a kit or a priority is missing.
 * @param number the order being changed; a new one has none
 */
export function kitOrderChange(
  draft: KitOrderDraft,
  kits: readonly OrderableKit[],
  number: string | null,
): BookChangeInput | null {
  const kit = kits.find((one) => one.partNumber === draft.kit);
  if (kit === undefined || !/^\s*\d+\s*$/.test(draft.priority)) return null;
  const offered = new Set(kit.options.map((option) => option.code));
  const order = {
    kit: draft.kit,
    options: draft.options.filter((code) => offered.has(code)),
    serial: draft.serial,
    wantedOn: draft.wantedOn,
    priority: Number(draft.priority),
  };
  if (number !== null) return { kitOrders: { change: [{ number, ...order }] } };
  return { kitOrders: { add: [{ number: draft.number, ...order }] } };
}
