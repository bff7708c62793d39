import type { IsoDate, PlanLine } from "~/domain/planning/types";
import type { Shop } from "./factories";
import { addDays, type Netting } from "./naive-netting";

const later = (a: IsoDate, b: IsoDate) => (a > b ? a : b);
const some = (values: bigint[], blocks: number[]) => blocks.some((at) => values[at] > 0n);

/** Kits with a structure, and phantoms under nothing else: where options and serials may stand. */
function isOpen(shop: Shop, partNumber: string): boolean {
  if (!shop.lines.some((line) => line.parent === partNumber)) return false;
  const above = shop.lines.filter((line) => line.component === partNumber);
  const part = shop.parts.find((one) => one.partNumber === partNumber);
  return (
    above.length === 0 || (part?.sourcing === "phantom" && above.every((line) => isOpen(shop, line.parent)))
  );
}

/**
 * ready(part) of PLANNING.md, section 5, as the kits of block `last` see it: a part's total need is that of
 * all blocks served up to it, but what options and serials ask counts for these kits alone.
 */
export function naiveReady(shop: Shop, netting: Netting, last: number): (partNumber: string) => IsoDate {
  const known = new Map<string, IsoDate>();
  const served = Array.from({ length: last + 1 }, (_, at) => at);
  const blocksOf = (partNumber: string) => (isOpen(shop, partNumber) ? [last] : served);
  const linesOf = (partNumber: string) => shop.lines.filter((line) => line.parent === partNumber);

  function netReady(partNumber: string): IsoDate {
    const part = netting.part(partNumber);
    const lines = linesOf(partNumber);
    const bought = part.sourcing === "buy" || (part.sourcing === "make" && lines.length === 0);
    if (bought) return addDays(shop.today, part.leadTimeDays);
    const components = lines
      .filter((line) => netting.takes(line, blocksOf(partNumber)))
      .map((line) => ready(line.component))
      .reduce(later, shop.today);
    return part.sourcing === "phantom" ? components : addDays(components, part.leadTimeDays);
  }

  function ready(partNumber: string): IsoDate {
    const before = known.get(partNumber);
    if (before) return before;
    const { net, lastDue } = netting.figures(partNumber);
    const blocks = blocksOf(partNumber);
    const due = blocks.map((at) => lastDue[at] ?? shop.today).reduce(later, shop.today);
    const date = some(net, blocks) ? later(due, netReady(partNumber)) : due;
    known.set(partNumber, date);
    return date;
  }
  return ready;
}

/** needBy of section 5 for one demand with a date; `blocks` are that demand's. */
export function naiveNeedBy(
  shop: Shop,
  netting: Netting,
  demand: { partNumber: string; due: IsoDate },
  blocks: number[],
): (partNumber: string) => IsoDate | null {
  function through(line: PlanLine): IsoDate[] {
    if (!netting.takes(line, blocks)) return [];
    const parent = netting.part(line.parent);
    const date = needBy(line.parent);
    if (date === null) return [];
    return [parent.sourcing === "phantom" ? date : addDays(date, -parent.leadTimeDays)];
  }

  function needBy(partNumber: string): IsoDate | null {
    const own = partNumber === demand.partNumber ? [demand.due] : [];
    const dates = shop.lines.filter((line) => line.component === partNumber).flatMap(through);
    return [...own, ...dates].sort()[0] ?? null;
  }
  return needBy;
}
