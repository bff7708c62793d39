import { parseSerial } from "~/domain/planning/netting/serial";
import { offeredOptions } from "~/domain/planning/netting/split-demand";
import { partKey } from "~/domain/planning/part-key";
import type { PlanDemand } from "~/domain/planning/types";
import type { PlanBook } from "./get-plan-book.server";

/**
 * Open kit orders as demands of one kit each, in the order of service, the first so many of them. A
 * wanted date that has passed asks for the kit today. An option that the kit no longer offers, since its
 * structure has changed after the order came in, adds nothing: one order must not hide the others.
 */
export function openOrderDemands(
  { kitOrders, day, structure }: Pick<PlanBook, "kitOrders" | "day" | "structure">,
  most = kitOrders.length,
): PlanDemand[] {
  const offered = new Map<string, string[]>();
  const optionsOf = (partNumber: string) => {
    const number = structure.numberOf.get(partKey(partNumber));
    const known = offered.get(partNumber) ?? (number === undefined ? [] : offeredOptions(structure, number));
    offered.set(partNumber, known);
    return known;
  };
  return kitOrders.slice(0, most).map(({ partNumber, options, serial, wantedOn }) => ({
    partNumber,
    quantity: "1",
    due: wantedOn !== null && wantedOn >= day ? wantedOn : null,
    options: options.filter((option) => optionsOf(partNumber).includes(option)),
    serial: serial !== null && parseSerial(serial) ? serial : null,
  }));
}
