import { type Steps, subtractSteps } from "../quantity/steps";
import { lineNeed } from "./netting/line-need";
import type { PassState } from "./netting/pass-state";
import type { QuantityLines, Structure } from "./structure/structure";

/** What one line asks of its component in a pass, on top of what was asked before. Whole steps. */
export interface LineCause {
  /** Index into the structure's lines. */
  line: number;
  parent: number;
  component: number;
  /** What of the parent goes through the line: started, or passed on by a phantom. */
  through: Steps;
  need: Steps;
  /** The sum did not come out even. */
  isRounded: boolean;
}

/** Why a part is needed. The needs of the causes and what is asked directly add up to `gross`. */
interface Need {
  gross: Steps;
  /** By demands on the part itself. */
  asked: Steps;
  causes: LineCause[];
}

/**
 * Why a pass needs a part: every line that asks for it, in the order of the structure, and what is asked
 * for directly. `base` is what was served before the kits asked about.
 */
export function explainNeed(structure: Structure, state: PassState, base: PassState, part: number): Need {
  const causes: LineCause[] = [];
  for (let parent = 0; parent < part; parent++) {
    if (!(state.start[parent] > 0)) continue;
    for (const cause of linesOf(structure, state, base, parent)) {
      if (cause.component === part) causes.push(cause);
    }
  }
  return {
    gross: subtractSteps(state.gross[part], base.gross[part]),
    asked: subtractSteps(state.asked.get(part) ?? 0, base.asked.get(part) ?? 0),
    causes,
  };
}

/** What a part that is started asks of each of its components in a pass, on top of `base`. */
export function explainStart(
  structure: Structure,
  state: PassState,
  base: PassState,
  part: number,
): LineCause[] {
  return state.start[part] > 0 ? linesOf(structure, state, base, part) : [];
}

function linesOf(structure: Structure, state: PassState, base: PassState, parent: number): LineCause[] {
  const { fixed, conditional } = structure;
  const found: LineCause[] = [];
  const add = (lines: QuantityLines, at: number, after: Steps, before: Steps) => {
    const need = subtractSteps(lineNeed(lines, at, after), lineNeed(lines, at, before));
    if (!(need > 0)) return;
    const through = subtractSteps(after, before);
    const isRounded = !comesOutEven(lines, at, through, need);
    found.push({ line: lines.source[at], parent, component: lines.component[at], through, need, isRounded });
  };
  eachLine(fixed, parent, (at) => add(fixed, at, state.start[parent], base.start[parent]));
  eachLine(conditional, parent, (at) => add(conditional, at, state.throughLine[at], base.throughLine[at]));
  return found;
}

function eachLine(lines: QuantityLines, parent: number, visit: (at: number) => void): void {
  for (let at = lines.starts[parent]; at < lines.starts[parent + 1]; at++) visit(at);
}

function comesOutEven(lines: QuantityLines, at: number, through: Steps, need: Steps): boolean {
  const { num, den } = lines.wide.get(at) ?? { num: BigInt(lines.num[at]), den: BigInt(lines.den[at]) };
  return BigInt(through) * num === BigInt(need) * den;
}
