import type { Shop } from "./factories";
import { blocksOf, boughtParts, missingFor, type ServiceOrder } from "./service-order";

const LIMIT = 1_000_000n;

/** Whether any bought part can be reached through lines with a quantity above 0. */
function limited(shop: Shop, kit: string): boolean {
  const bought = new Set(boughtParts(shop));
  const seen = new Set<string>();
  const open = [kit];
  for (let next = open.pop(); next !== undefined; next = open.pop()) {
    if (seen.has(next)) continue;
    seen.add(next);
    if (bought.has(next)) return true;
    for (const line of shop.lines) {
      if (line.parent === next && line.quantity !== null && Number(line.quantity) > 0)
        open.push(line.component);
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
    if (!limited(shop, demand.partNumber)) answer.push(null);
    else if (stoppedBefore) answer.push(0);
    else {
      const adds = (n: bigint) => missingFor(shop, [...before, ...blocksOf(shop, at, n, false)]);
      answer.push(Number(largest(last ? LIMIT : BigInt(demand.quantity), (n) => same(adds(n), base))));
    }
  });
  return answer;
}

export function naiveBuildable(shop: Shop, order: ServiceOrder): (number | null)[] {
  const { shipped } = order;
  if (shipped === null || shipped.length === order.blocks.length) return strictBuildable(shop);
  return shop.demand.map((demand, at) =>
    limited(shop, demand.partNumber) ? shipped.filter((kit) => kit.demand === at).length : null,
  );
}
