import { divideUp } from "../../quantity/divide-up";
import type { Steps } from "../../quantity/steps";
import { narrowSteps } from "../../quantity/steps";
import type { QuantityLines } from "../structure/structure";

/** What a line asks of its component for so many steps of its parent; `at` is its place in the group. */
export function lineNeed(lines: QuantityLines, at: number, parentSteps: Steps): Steps {
  const { num, den } = lines.wide.get(at) ?? { num: BigInt(lines.num[at]), den: BigInt(lines.den[at]) };
  return narrowSteps(divideUp(BigInt(parentSteps) * num, den));
}
