import { formatSteps } from "../../quantity/format-steps";
import { parseSteps, requireSteps } from "../../quantity/parse-steps";
import type { Steps } from "../../quantity/steps";
import { addSteps, leastSteps, subtractSteps } from "../../quantity/steps";
import { partKey } from "../part-key";
import type { Structure } from "../structure/structure";
import type { PlanStock } from "../types";
import type { WhatIf, WhatIfProblem } from "./what-if";

export type ChangedStock = { ok: true; stock: PlanStock[] } | { ok: false; problems: WhatIfProblem[] };

/**
 * Stock with lots held and quantities added or taken away. What is added has no expiry; what is taken
 * away leaves the lots that expire last first, so that the plan counts on nothing it may not have.
 */
export function changeStock(
  structure: Structure,
  stock: readonly PlanStock[],
  { hold, stock: changes }: Pick<WhatIf, "hold" | "stock">,
): ChangedStock {
  const problems: WhatIfProblem[] = [];
  let rows = [...stock];
  hold.forEach(({ partNumber, lot }, at) => {
    const key = partKey(partNumber);
    const isHeld = (row: PlanStock) => partKey(row.partNumber) === key && (lot === null || row.lot === lot);
    if (!structure.numberOf.has(key)) problems.push({ code: "unknown-part", list: "hold", at, partNumber });
    else if (lot !== null && !rows.some(isHeld)) {
      problems.push({ code: "unknown-lot", list: "hold", at, partNumber, lot });
    }
    rows = rows.filter((row) => !isHeld(row));
  });
  changes.forEach((change, at) => {
    const changed = changePart(structure, rows, change, at);
    if (changed.ok) rows = changed.stock;
    else problems.push(...changed.problems);
  });
  return problems.length > 0 ? { ok: false, problems } : { ok: true, stock: rows };
}

function changePart(
  structure: Structure,
  rows: PlanStock[],
  { partNumber, change }: WhatIf["stock"][number],
  at: number,
): ChangedStock {
  const number = structure.numberOf.get(partKey(partNumber));
  if (number === undefined) return refuse({ code: "unknown-part", list: "stock", at, partNumber });
  const decimals = structure.decimals[number];
  const isLess = change.startsWith("-");
  const steps = parseSteps(change.replace(/^[+-]/, ""), decimals);
  if (!steps.ok) return refuse({ code: "too-many-decimals", list: "stock", at, decimals, quantity: change });
  if (!isLess) {
    const quantity = formatSteps(steps.steps, decimals);
    return { ok: true, stock: [...rows, { partNumber, quantity, expiresOn: null, lot: null }] };
  }
  return takeAway(rows, { partNumber, wanted: steps.steps, decimals, at });
}

function takeAway(
  rows: PlanStock[],
  { partNumber, wanted, decimals, at }: { partNumber: string; wanted: Steps; decimals: number; at: number },
): ChangedStock {
  const key = partKey(partNumber);
  const own = rows.filter((row) => partKey(row.partNumber) === key);
  const rest = rows.filter((row) => partKey(row.partNumber) !== key);
  let left = wanted;
  let available: Steps = 0;
  for (const row of own.sort(lastToExpireFirst)) {
    const here = requireSteps(row.quantity, decimals);
    const taken = leastSteps(left, here);
    available = addSteps(available, here);
    left = subtractSteps(left, taken);
    rest.push({ ...row, quantity: formatSteps(subtractSteps(here, taken), decimals) });
  }
  if (!(left > 0)) return { ok: true, stock: rest };
  const say = formatSteps(available, decimals);
  return refuse({ code: "less-than-nothing", list: "stock", at, partNumber, available: say });
}

function refuse(problem: WhatIfProblem): ChangedStock {
  return { ok: false, problems: [problem] };
}

function lastToExpireFirst(a: PlanStock, b: PlanStock): number {
  const [left, right] = [a.expiresOn ?? "9999-12-31", b.expiresOn ?? "9999-12-31"];
  return left < right ? 1 : left > right ? -1 : 0;
}
