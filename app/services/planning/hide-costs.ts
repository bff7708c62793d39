import type { ShipCheck } from "~/domain/planning/types";

/** The answer for people who may not see prices, costs and values. */
export function hideCosts(answer: ShipCheck): ShipCheck {
  return { ...answer, ladder: answer.ladder.map((rung) => ({ ...rung, cost: null })) };
}
