import { checkShip } from "~/domain/planning/check-ship";
import { compileStructure } from "~/domain/planning/compile-structure";
import type { ShipCheck } from "~/domain/planning/types";
import type { Shop } from "./factories";

/** The core's answer for a shop that is sound; throws the problems where it is not. */
export function runCore(shop: Shop): ShipCheck {
  const compiled = compileStructure(shop.parts, shop.lines);
  if (!compiled.ok) throw new Error(JSON.stringify(compiled.problems));
  const { stock, supply, demand, sharing, today } = shop;
  const checked = checkShip({ structure: compiled.structure, stock, supply, demand, sharing, today });
  if (!checked.ok) throw new Error(JSON.stringify(checked.problems));
  return checked.answer;
}
