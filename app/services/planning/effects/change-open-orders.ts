import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanSupply } from "~/domain/planning/types";
import { parseSteps } from "~/domain/quantity/parse-steps";
import type { BookChange } from "~/schemas/planning/effects";
import { refuseChange } from "./refuse-change";

/** Open orders as they would be: some taken out, some on other days, new ones added. */
export function changeOpenOrders(
  structure: Structure,
  orders: readonly PlanSupply[],
  { add, move, remove }: BookChange["supply"],
): PlanSupply[] {
  let rows = [...orders];
  const find = (list: "move" | "remove", at: number, named: BookChange["supply"]["remove"][number]) => {
    const { reference, partNumber } = named;
    const key = partNumber === null ? null : partKey(partNumber);
    const found = new Set(
      rows.filter((row) => row.reference === reference && (key === null || partKey(row.partNumber) === key)),
    );
    if (found.size > 0) return found;
    const which = partNumber === null ? "" : ` for ${partNumber}`;
    throw refuseChange(
      `supply.${list}.${at}`,
      reference,
      `No open order${which} has the number ${reference}.`,
    );
  };
  remove.forEach((named, at) => {
    const found = find("remove", at, named);
    rows = rows.filter((row) => !found.has(row));
  });
  move.forEach((named, at) => {
    const found = find("move", at, named);
    rows = rows.map((row) => (found.has(row) ? { ...row, due: named.due } : row));
  });
  add.forEach((order, at) => {
    rows.push(checkOrder(structure, order, `supply.add.${at}`));
  });
  return rows;
}

function checkOrder(structure: Structure, order: PlanSupply, place: string): PlanSupply {
  const { partNumber, quantity } = order;
  const number = structure.numberOf.get(partKey(partNumber));
  if (number === undefined) {
    const message = `There is no part ${partNumber} in the book.`;
    throw refuseChange(`${place}.partNumber`, partNumber, message);
  }
  const decimals = structure.decimals[number];
  if (parseSteps(quantity, decimals).ok) return order;
  const message = `${quantity} does not fit: ${partNumber} is counted with ${decimals} decimals.`;
  throw refuseChange(`${place}.quantity`, quantity, message);
}
