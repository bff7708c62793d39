import { partKey } from "~/domain/planning/part-key";
import type { KitOrderRow } from "~/schemas/imports/kit-orders";
import type { OrderableKit } from "~/schemas/kit-orders/presented-kit-order";
import type { Decision } from "~/services/imports/import-job";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { StoredRecord } from "./decide-records";
import { sameValues } from "./same-values";

export interface StoredKitOrder extends StoredRecord<KitOrderRow> {
  state: "open" | "shipped" | "cancelled";
}

/** What one kit with one serial is known by; null without a serial. */
function serialKey({ kit, serial }: KitOrderRow): string | null {
  return serial === null ? null : JSON.stringify([partKey(kit), serial]);
}

function checkOne(
  decision: Decision,
  state: StoredKitOrder["state"] | undefined,
  kits: readonly OrderableKit[],
): CsvProblem[] {
  const { row, before, after } = decision;
  const order = after as KitOrderRow;
  if (state !== undefined && state !== "open" && !sameValues(before, after)) {
    return [{ ...row.at("number"), expected: `an open order; this one is ${state} and stays as it is` }];
  }
  const kit = kits.find((one) => partKey(one.partNumber) === partKey(order.kit));
  if (kit === undefined) {
    return [{ ...row.at("kit"), expected: "a kit that can be ordered: a make part with sold set to 1" }];
  }
  const offered = kit.options.map((option) => option.code);
  if (order.options.every((code) => offered.includes(code))) return [];
  const expected =
    offered.length === 0 ? `no option, since ${kit.partNumber} has none` : `options of ${offered.join(", ")}`;
  return [{ ...row.at("options"), expected }];
}

/** Adds to each decision what is wrong with its order beside the book: kit, options, state, and a serial used twice. */
export function checkKitOrders(
  decisions: readonly Decision[],
  stored: ReadonlyMap<string, StoredKitOrder>,
  kits: readonly OrderableKit[],
): void {
  const named = new Set(decisions.map((decision) => (decision.after as KitOrderRow).number));
  const takers = new Map<string, string>();
  for (const [number, order] of stored) {
    const key = serialKey(order.value);
    if (key !== null && order.state !== "cancelled" && !named.has(number)) takers.set(key, number);
  }
  for (const decision of decisions) {
    const order = decision.after as KitOrderRow;
    const state = stored.get(order.number)?.state;
    decision.problems.push(...checkOne(decision, state, kits));
    const key = serialKey(order);
    if (key === null || state === "cancelled") continue;
    const taker = takers.get(key);
    if (taker === undefined) takers.set(key, order.number);
    else {
      const expected = `a serial that is free; order ${taker} has this one`;
      decision.problems.push({ ...decision.row.at("serial"), expected });
    }
  }
}
