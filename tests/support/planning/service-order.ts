import type { Shop } from "./factories";
import { type Kits, naiveNetting } from "./naive-netting";
import { smaller } from "./rational";

/** Serials at which a line begins or ends to count: between two of them kits are alike. */
function turningSerials(shop: Shop): bigint[] {
  return shop.lines.flatMap((line) => [
    ...(line.fromSerial === null ? [] : [BigInt(line.fromSerial)]),
    ...(line.toSerial === null ? [] : [BigInt(line.toSerial) + 1n]),
  ]);
}

/** The kits of one demand, in blocks of kits alike, or each kit alone. */
export function blocksOf(shop: Shop, demand: number, count: bigint, alone: boolean): Kits[] {
  const { partNumber, due, options, serial } = shop.demand[demand];
  const first = serial === null ? 0n : BigInt(serial);
  const turns = serial === null ? [] : turningSerials(shop);
  const blocks: Kits[] = [];
  let from = 0n;
  while (from < count) {
    const ends = turns.map((turn) => turn - first).filter((end) => end > from);
    const to = alone ? from + 1n : ends.reduce(smaller, count);
    const own = serial === null ? null : first + from;
    blocks.push({ demand, partNumber, due, options, count: to - from, serial: own });
    from = to;
  }
  return blocks;
}

/** The first `count` kits in the order of service. */
export function firstKits(blocks: Kits[], count: bigint): Kits[] {
  const taken: Kits[] = [];
  let left = count;
  for (const block of blocks) {
    if (left === 0n) break;
    const part = smaller(block.count, left);
    taken.push({ ...block, count: part });
    left -= part;
  }
  return taken;
}

/** Parts that a firm cannot build: bought, or made without a structure. */
export function boughtParts(shop: Shop): string[] {
  const parents = new Set(shop.lines.map((line) => line.parent));
  return shop.parts
    .filter((part) => part.sourcing === "buy" || (part.sourcing === "make" && !parents.has(part.partNumber)))
    .map((part) => part.partNumber);
}

/** What each bought part lacks, here and now, for these kits together. */
export function missingFor(shop: Shop, blocks: Kits[]): Map<string, bigint> {
  const netting = naiveNetting(shop, blocks, "now");
  return new Map(
    boughtParts(shop).map((partNumber) => [
      partNumber,
      netting.figures(partNumber).net.reduce((total, amount) => total + amount, 0n),
    ]),
  );
}

export function lacksNothing(shop: Shop, blocks: Kits[]): boolean {
  return [...missingFor(shop, blocks).values()].every((amount) => amount === 0n);
}

export interface ServiceOrder {
  blocks: Kits[];
  /** With `release`: the kits that ship. */
  shipped: Kits[] | null;
}

/**
 * Section 4: strict serves in the order given. Release takes the kits one by one: one that can be complete
 * with what those already taken leave ships, the rest are served after them.
 */
export function serviceOrder(shop: Shop): ServiceOrder {
  const release = shop.sharing === "release";
  const strict = shop.demand.flatMap((demand, at) => blocksOf(shop, at, BigInt(demand.quantity), release));
  if (!release) return { blocks: strict, shipped: null };
  const shipped: Kits[] = [];
  const waiting: Kits[] = [];
  for (const kit of strict) {
    if (lacksNothing(shop, [...shipped, kit])) shipped.push(kit);
    else waiting.push(kit);
  }
  return { blocks: [...shipped, ...waiting], shipped };
}
