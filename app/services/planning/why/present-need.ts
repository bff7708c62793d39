import { explainNeed, explainStart, type LineCause } from "~/domain/planning/explain-need";
import type { PassState } from "~/domain/planning/netting/pass-state";
import type { ShipPlan } from "~/domain/planning/plan-ship";
import { formatSteps } from "~/domain/quantity/format-steps";
import { type Steps, subtractSteps } from "~/domain/quantity/steps";
import type { WhyCause, WhyComponent, WhyPart } from "~/schemas/planning/why";

/** A pass of a plan: what it has served, and what was served before the kits asked about. */
export interface Pass {
  plan: ShipPlan;
  state: PassState;
  base: PassState;
  /** A part as it is shown. */
  show: (part: number) => WhyPart;
}

/** What the kits asked about add to a figure of a part. */
export function figureOf(
  { state, base }: Pass,
  figure: "gross" | "fromStock" | "onOrder" | "net" | "start",
  part: number,
): Steps {
  return subtractSteps(state[figure][part], base[figure][part]);
}

/** The lines that ask for a part. */
export function presentCauses(pass: Pass, part: number): { asked: Steps; causes: WhyCause[] } {
  const { plan, state, base } = pass;
  const { asked, causes } = explainNeed(plan.structure, state, base, part);
  return { asked, causes: causes.map((cause) => presentCause(pass, cause)) };
}

function presentCause({ plan: { structure }, show }: Pass, cause: LineCause): WhyCause {
  const line = structure.lines[cause.line];
  const parent = show(cause.parent);
  const component = structure.decimals[cause.component];
  return {
    parent,
    through: formatSteps(cause.through, parent.decimals),
    quantity: line.quantity ?? "0",
    scrap: line.scrap,
    option: line.option,
    need: formatSteps(cause.need, component),
    isRounded: cause.isRounded,
  };
}

/** What a part that is started asks of its components; those that lack something first. */
export function presentComponents(pass: Pass, part: number): WhyComponent[] {
  const { plan, state, base, show } = pass;
  const needs = new Map<number, Steps>();
  for (const { component, need } of explainStart(plan.structure, state, base, part)) {
    needs.set(component, BigInt(needs.get(component) ?? 0) + BigInt(need));
  }
  const rows = [...needs].map(([component, need]): WhyComponent => {
    const shown = show(component);
    const lacking = figureOf(pass, "net", component);
    return {
      component: shown,
      need: formatSteps(need, shown.decimals),
      lacking: lacking > 0 ? formatSteps(lacking, shown.decimals) : null,
    };
  });
  return [
    ...rows.filter(({ lacking }) => lacking !== null),
    ...rows.filter(({ lacking }) => lacking === null),
  ];
}
