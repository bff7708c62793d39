import { offeredOptions } from "~/domain/planning/netting/split-demand";
import { partKey } from "~/domain/planning/part-key";
import type { BookChange } from "~/schemas/planning/effects";
import type { PlanBook } from "../get-plan-book.server";
import { refuseChange } from "./refuse-change";

/** Only what is sold as a kit can be ordered, with the options that its structure offers. Throws 422 for the rest. */
export function checkOrderedKits(
  { structure, parts }: Pick<PlanBook, "structure" | "parts">,
  { add, change }: BookChange["kitOrders"],
): void {
  const check = (place: string, kit: string, options: readonly string[] = []) => {
    const number = structure.numberOf.get(partKey(kit));
    const sold = parts.some((part) => partKey(part.partNumber) === partKey(kit) && part.sold);
    if (number === undefined || !sold || structure.parts[number].sourcing !== "make") {
      const message = `${kit} is no kit that can be ordered. Choose one of the list.`;
      throw refuseChange(`${place}.kit`, kit, message);
    }
    const offered = offeredOptions(structure, number);
    const unknown = options.find((option) => !offered.includes(option));
    if (unknown === undefined) return;
    throw refuseChange(`${place}.options`, unknown, `${kit} has no option ${unknown}.`);
  };
  add.forEach(({ kit, options }, at) => {
    check(`kitOrders.add.${at}`, kit, options);
  });
  change.forEach(({ kit, options }, at) => {
    if (kit !== undefined) check(`kitOrders.change.${at}`, kit, options);
  });
}
