import type { PlanLine } from "~/domain/planning/types";
import type { Shop } from "./factories";
import { countsFor, type Kits } from "./naive-netting";
import { blocksOf, boughtParts, lacksNothing, missingFor, type ServiceOrder } from "./service-order";

const LIMIT = 1_000_000n;

/** Whether a line counts for any kit of a demand; `forever`, whether for those past any number too. */
function everCounts(shop: Shop, line: PlanLine, demand: number, forever: boolean): boolean {
  const many = blocksOf(shop, demand, 10n ** 12n, false);
  return (forever ? many.slice(-1) : many).some((kits) => countsFor(line, kits, shop.today));
}

/** Whether any bought part can be reached through lines with a quantity above 0 that count. */
function limited(shop: Shop, demand: number, forever = false): boolean {
  const bought = new Set(boughtParts(shop));
  const seen = new Set<string>();
  const open = [shop.demand[demand].partNumber];
  for (let next = open.pop(); next !== undefined; next = open.pop()) {
    if (seen.has(next)) continue;
    seen.add(next);
    if (bought.has(next)) return true;
    for (const line of shop.lines) {
      const takes = line.parent === next && line.quantity !== null && Number(line.quantity) > 0;
      if (takes && everCounts(shop, line, demand, forever)) open.push(line.component);
    }
  }
  return false;
}

function same(a: Map<string, bigint>, b: Map<string, bigint>): boolean {
  return [...a].every(([partNumber, amount]) => b.get(partNumber) === amount);
}

/** The largest n up to `most` with `holds(n)`, where holding for n means holding below it. */
function largest(most: bigint, holds: (n: bigint) => boolean): bigint {
  let low = 0n;
  let high = 1n;
  while (high <= most && holds(high)) {
    low = high;
    high *= 2n;
  }
  if (high > most) high = most + 1n;
  while (high - low > 1n) {
    const middle = (low + high) / 2n;
    if (holds(middle)) low = middle;
    else high = middle;
  }
  return low;
}

function alike(shop: Shop, a: number, b: number): boolean {
  const key = ({ partNumber, due, options }: Shop["demand"][number]) =>
    JSON.stringify([partNumber, due, [...options].sort()]);
  return (
    shop.demand[a].serial === null &&
    shop.demand[b].serial === null &&
    key(shop.demand[a]) === key(shop.demand[b])
  );
}

/** Past the limit, lines may have ceased to count: then nothing limits. */
function numberOrNull(shop: Shop, demand: number, count: bigint): number | null {
  return count === LIMIT && !limited(shop, demand, true) ? null : Number(count);
}

/** Kits of each demand that are complete today, strict: the last demand's are not held to what was asked. */
function strictBuildable(shop: Shop): (number | null)[] {
  const answer: (number | null)[] = [];
  shop.demand.forEach((demand, at) => {
    const before = shop.demand
      .slice(0, at)
      .flatMap((asked, i) => blocksOf(shop, i, BigInt(asked.quantity), false));
    const base = missingFor(shop, before);
    const last = at === shop.demand.length - 1;
    const stoppedBefore = answer.some(
      (built, i) => alike(shop, i, at) && built !== null && BigInt(built) < BigInt(shop.demand[i].quantity),
    );
    if (!limited(shop, at)) answer.push(null);
    else if (stoppedBefore) answer.push(0);
    else {
      const adds = (n: bigint) => missingFor(shop, [...before, ...blocksOf(shop, at, n, false)]);
      const most = last ? LIMIT : BigInt(demand.quantity);
      answer.push(
        numberOrNull(
          shop,
          at,
          largest(most, (n) => same(adds(n), base)),
        ),
      );
    }
  });
  return answer;
}

/** With release: what ships of each demand; the last one, where all of it ships, goes on past what was asked. */
function releaseBuildable(shop: Shop, shipped: Kits[]): (number | null)[] {
  return shop.demand.map((demand, at) => {
    if (!limited(shop, at)) return null;
    const count = shipped.filter((kit) => kit.demand === at).length;
    if (at < shop.demand.length - 1 || count < Number(demand.quantity)) return count;
    const others = shipped.filter((kit) => kit.demand !== at);
    const all = (n: bigint) => [...others, ...blocksOf(shop, at, n, false)];
    return numberOrNull(
      shop,
      at,
      largest(LIMIT, (n) => lacksNothing(shop, all(n))),
    );
  });
}

export function naiveBuildable(shop: Shop, order: ServiceOrder): (number | null)[] {
  return order.shipped === null ? strictBuildable(shop) : releaseBuildable(shop, order.shipped);
}
