import { parseSteps } from "../../quantity/parse-steps";
import { partKey } from "../part-key";
import type { Structure } from "../structure/structure";
import type { PlanSupply } from "../types";
import type { WhatIfProblem, WhatIfSupply } from "./what-if";

export type ChangedSupply = { ok: true; supply: PlanSupply[] } | { ok: false; problems: WhatIfProblem[] };

/** Open orders with new ones added and every line of a named order moved to another day. */
export function changeSupply(
  structure: Structure,
  supply: readonly PlanSupply[],
  changes: readonly WhatIfSupply[],
): ChangedSupply {
  const problems: WhatIfProblem[] = [];
  let rows = [...supply];
  changes.forEach((change, at) => {
    if ("reference" in change) {
      const { reference, due } = change;
      if (!rows.some((row) => row.reference === reference)) {
        problems.push({ code: "unknown-reference", list: "supply", at, reference });
      }
      rows = rows.map((row) => (row.reference === reference ? { ...row, due } : row));
      return;
    }
    const { partNumber, quantity, due } = change;
    const number = structure.numberOf.get(partKey(partNumber));
    if (number === undefined) problems.push({ code: "unknown-part", list: "supply", at, partNumber });
    else if (!parseSteps(quantity, structure.decimals[number]).ok) {
      const decimals = structure.decimals[number];
      problems.push({ code: "too-many-decimals", list: "supply", at, decimals, quantity });
    } else rows.push({ partNumber, quantity, due, reference: null });
  });
  return problems.length > 0 ? { ok: false, problems } : { ok: true, supply: rows };
}
