import { formatSteps } from "../quantity/format-steps";
import type { Steps } from "../quantity/steps";
import { addSteps } from "../quantity/steps";
import { lineNeed } from "./netting/line-need";
import type { PassState } from "./netting/pass-state";
import type { Structure } from "./structure/structure";
import type { Causes } from "./types";

/**
 * Why a part is needed in a pass: the parents that are started and how much each asks for, and what is
 * asked for directly. The quantities add up to `gross`. Parents in the order of the structure.
 */
export function explainNeed(structure: Structure, state: PassState, part: number): Causes {
  const say = (steps: Steps) => formatSteps(steps, structure.decimals[part]);
  const byParent = new Map<number, Steps>();
  for (const { parent, need } of linesInto(structure, state, part)) {
    byParent.set(parent, addSteps(byParent.get(parent) ?? 0, need));
  }
  const asked = state.asked.get(part) ?? 0;
  return {
    partNumber: structure.parts[part].partNumber,
    gross: say(state.gross[part]),
    parents: [...byParent].map(([parent, need]) => ({
      partNumber: structure.parts[parent].partNumber,
      quantity: say(need),
    })),
    asked: say(asked),
  };
}

function linesInto(structure: Structure, state: PassState, part: number): { parent: number; need: Steps }[] {
  const { fixed, conditional } = structure;
  const found: { parent: number; need: Steps }[] = [];
  const keep = (parent: number, need: Steps) => {
    if (need > 0) found.push({ parent, need });
  };
  for (let parent = 0; parent < part; parent++) {
    if (!(state.start[parent] > 0)) continue;
    for (let k = fixed.starts[parent]; k < fixed.starts[parent + 1]; k++) {
      if (fixed.component[k] === part) keep(parent, lineNeed(fixed, k, state.start[parent]));
    }
    for (let k = conditional.starts[parent]; k < conditional.starts[parent + 1]; k++) {
      if (conditional.component[k] === part) keep(parent, lineNeed(conditional, k, state.throughLine[k]));
    }
  }
  return found;
}
