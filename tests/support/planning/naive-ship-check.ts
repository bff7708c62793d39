import type { IsoDate, Rung, ShipCheck, Shortage } from "~/domain/planning/types";
import type { Shop } from "./factories";
import { naiveBuildable } from "./naive-buildable";
import { naiveNeedBy, naiveReady } from "./naive-dates";
import { addDays, type Figures, type Kits, type Netting, naiveNetting } from "./naive-netting";
import { dividedBy, rational, smaller, tenTo, times, toText, wholeNumber } from "./rational";
import { boughtParts, firstKits, missingFor, serviceOrder } from "./service-order";

/** The part of the answer that is a number or a date; the chain and the warnings are checked by rules. */
export type NaiveAnswer = Omit<ShipCheck, "criticalChain" | "warnings" | "debts">;

const sum = (values: bigint[]) => values.reduce((total, value) => total + value, 0n);
const every = (blocks: Kits[]) => blocks.map((_, at) => at);
const byNumber = (a: { partNumber: string }, b: { partNumber: string }) =>
  a.partNumber < b.partNumber ? -1 : 1;

function quantities(
  netting: Netting,
  partNumber: string,
  names: (keyof Omit<Figures, "lastDue">)[],
): string[] {
  const figures = netting.figures(partNumber);
  return names.map((name) => toText(sum(figures[name]), netting.part(partNumber).decimals));
}

/** Sum of short x unit cost, rounded once, half up, to two decimals. */
function costOf(shop: Shop, netting: Netting): string {
  const costs = boughtParts(shop).map((partNumber) => {
    const part = netting.part(partNumber);
    const short = dividedBy(wholeNumber(sum(netting.figures(partNumber).net)), tenTo(part.decimals));
    return times(short, rational(part.unitCost ?? "0"));
  });
  const total = costs.reduce(
    (a, b) => ({ over: a.over * b.under + b.over * a.under, under: a.under * b.under }),
    {
      over: 0n,
      under: 1n,
    },
  );
  const cents = times(total, wholeNumber(100n));
  return toText((2n * cents.over + cents.under) / (2n * cents.under), 2);
}

/** When the kits of each block are complete, each with those served before it. */
function completeOn(shop: Shop, blocks: Kits[]): IsoDate[] {
  const coming = naiveNetting(shop, blocks, "coming");
  return blocks.map((block, at) => naiveReady(shop, coming, at)(block.partNumber));
}

/** One rung, planned from nothing for the kits up to it. Stoppers in part number order. */
function rung(shop: Shop, blocks: Kits[], kits: number): Rung {
  const missing = [...missingFor(shop, blocks)].filter(([, amount]) => amount > 0n);
  const decimals = new Map(shop.parts.map((part) => [part.partNumber, part.decimals]));
  return {
    partNumber: blocks[blocks.length - 1].partNumber,
    kits,
    cost: costOf(shop, naiveNetting(shop, blocks, "coming-by-date")),
    readyOn: completeOn(shop, blocks).sort()[blocks.length - 1],
    stoppers: missing
      .map(([partNumber, amount]) => ({ partNumber, missing: toText(amount, decimals.get(partNumber) ?? 0) }))
      .sort(byNumber),
  };
}

/** The smallest number of kits, in the order of service, that the part is missing for. */
function stopsAt(shop: Shop, blocks: Kits[], partNumber: string): number {
  let low = 0n;
  let high = sum(blocks.map((block) => block.count));
  while (high - low > 1n) {
    const middle = (low + high) / 2n;
    if ((missingFor(shop, firstKits(blocks, middle)).get(partNumber) ?? 0n) > 0n) high = middle;
    else low = middle;
  }
  return Number(high);
}

function datesFor(shop: Shop, blocks: Kits[], byDate: Netting, partNumber: string) {
  const needBy: IsoDate[] = [];
  const orderBy: IsoDate[] = [];
  shop.demand.forEach(({ partNumber: kit, due }, demand) => {
    const own = every(blocks).filter((at) => blocks[at].demand === demand);
    const short = own.some((at) => byDate.figures(partNumber).net[at] > 0n);
    if (due === null) {
      if (short) orderBy.push(shop.today);
      return;
    }
    const date = naiveNeedBy(shop, byDate, { partNumber: kit, due }, own)(partNumber);
    if (date === null) return;
    needBy.push(date);
    if (short) orderBy.push(addDays(date, -byDate.part(partNumber).leadTimeDays));
  });
  return { needBy: needBy.sort()[0] ?? null, orderBy: orderBy.sort()[0] ?? null };
}

function shortages(shop: Shop, blocks: Kits[], byDate: Netting): Shortage[] {
  const ready = naiveReady(shop, naiveNetting(shop, blocks, "coming"), blocks.length - 1);
  return [...missingFor(shop, blocks)]
    .filter(([, amount]) => amount > 0n)
    .map(([partNumber, amount]) => {
      const [gross, fromStock, onOrder, short] = quantities(byDate, partNumber, [
        "gross",
        "fromStock",
        "onOrder",
        "net",
      ]);
      const { unit, decimals } = byDate.part(partNumber);
      const readyOn = ready(partNumber);
      const { needBy, orderBy } = datesFor(shop, blocks, byDate, partNumber);
      const missing = toText(amount, decimals);
      const at = stopsAt(shop, blocks, partNumber);
      return {
        partNumber,
        unit,
        gross,
        fromStock,
        onOrder,
        short,
        missing,
        stopsAt: at,
        needBy,
        orderBy,
        readyOn,
      };
    })
    .sort(byNumber);
}

function builds(shop: Shop, byDate: Netting): ShipCheck["builds"] {
  return shop.parts
    .filter((part) => part.sourcing === "make" && sum(byDate.figures(part.partNumber).start) > 0n)
    .map(({ partNumber, unit }) => {
      const [gross, fromStock, onOrder, build] = quantities(byDate, partNumber, [
        "gross",
        "fromStock",
        "onOrder",
        "start",
      ]);
      return { partNumber, unit, gross, fromStock, onOrder, build };
    })
    .sort(byNumber);
}

/** The answer to a ship check from the text of PLANNING.md alone. Slow: every prefix is planned anew. */
export function naiveShipCheck(shop: Shop): NaiveAnswer {
  const order = serviceOrder(shop);
  const { blocks } = order;
  const total = sum(blocks.map((block) => block.count));
  const built = naiveBuildable(shop, order);
  const complete = completeOn(shop, blocks);
  const byDate = naiveNetting(shop, blocks, "coming-by-date");
  const demand = shop.demand.map((asked, at) => {
    const dates = complete.filter((_, i) => blocks[i].demand === at).sort();
    const earliest = dates[dates.length - 1];
    return { ...asked, options: [...asked.options], buildable: built[at], earliest };
  });
  const buildable: Record<string, number | null> = Object.create(null);
  const earliest: Record<string, IsoDate> = Object.create(null);
  for (const row of demand) {
    const before = row.partNumber in buildable ? buildable[row.partNumber] : 0;
    buildable[row.partNumber] = before === null || row.buildable === null ? null : before + row.buildable;
    earliest[row.partNumber] = [earliest[row.partNumber] ?? row.earliest, row.earliest].sort()[1];
  }
  const rungs = Number(smaller(total, 1000n));
  const ladder = Array.from({ length: rungs }, (_, at) =>
    rung(shop, firstKits(blocks, BigInt(at + 1)), at + 1),
  );
  return {
    today: shop.today,
    demand,
    buildable,
    earliest,
    ladder,
    shortages: shortages(shop, blocks, byDate),
    builds: builds(shop, byDate),
  };
}
