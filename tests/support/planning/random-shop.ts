import fc from "fast-check";
import type { IsoDate, PlanDemand, PlanLine, PlanPart, PlanSupply } from "~/domain/planning/types";
import { buildDemand, buildLine, buildPart, buildStock, buildSupply, type Shop, TODAY } from "./factories";
import { addDays } from "./naive-netting";
import { toText } from "./rational";

/** What a random shop may hold. Everything unless said otherwise. */
export interface Wishes {
  demands?: number;
  dates?: boolean;
  conditions?: boolean;
  losses?: boolean;
  decimals?: boolean;
  expiry?: boolean;
  supply?: boolean;
  release?: boolean;
  kits?: number;
}

/** The first are kits, the next two may be phantoms under kits alone; the rest is as it falls. */
const NAMES = [
  "S2",
  "S4",
  "BAG-1",
  "bag-2",
  "007",
  "1E05",
  "3-12",
  "__proto__",
  "constructor",
  "7",
  "Ünit",
  "toString",
];
const KITS = 2;
const OPEN = 4;

const dateAround = (from: number, to: number): fc.Arbitrary<IsoDate> =>
  fc.integer({ min: from, max: to }).map((days) => addDays(TODAY, days));

const steps = (most: number, decimals: number) =>
  fc.bigInt({ min: 0n, max: BigInt(most) }).map((n) => {
    // Half of a unit's steps at most, so that few decimals and many meet the same small quantities.
    const whole = n * 10n ** BigInt(decimals);
    return toText(decimals === 0 ? n : whole / 3n + n, decimals);
  });

const sourcingAt = (at: number, last: number): fc.Arbitrary<PlanPart["sourcing"]> => {
  if (at < KITS) return fc.constant("make");
  if (at < OPEN) return fc.constantFrom("phantom", "phantom", "make");
  if (at >= last) return fc.constantFrom("buy", "buy", "buy", "make");
  return fc.constantFrom("make", "make", "buy", "phantom");
};

function partAt(at: number, last: number, wishes: Wishes): fc.Arbitrary<PlanPart> {
  const decimals =
    wishes.decimals === false || at < KITS ? fc.constant(0) : fc.constantFrom(0, 0, 0, 1, 2, 3, 6);
  return fc
    .record({
      sourcing: sourcingAt(at, last),
      decimals,
      leadTimeDays: fc.constantFrom(0, 1, 3, 7, 20, 90),
      unitCost: fc.constantFrom(null, "0.005", "1", "12.345678", "1000"),
      good: wishes.losses === false ? fc.constant("1") : fc.constantFrom("1", "1", "0.85", "0.5", "0.99"),
    })
    .map(({ good, ...rest }) =>
      buildPart({ partNumber: NAMES[at], ...rest, yield: rest.sourcing === "make" ? good : "1" }),
    );
}

function conditions(open: boolean): fc.Arbitrary<Partial<PlanLine>> {
  if (!open) return fc.constant({});
  const serial = fc.option(fc.constantFrom("098", "100", "101", "103"), { freq: 2 });
  const date = fc.option(dateAround(-5, 60), { freq: 2 });
  return fc.oneof(
    fc.constant({}),
    fc.record({ option: fc.constantFrom("HEATER", "LIGHTS") }),
    fc.record({ fromSerial: serial, toSerial: serial }),
    fc.record({ fromDate: date, toDate: date }),
  );
}

interface Draft {
  parent: number;
  component: number;
}

/** Lines go from a lower to a higher place; parts 2 and 3 hang under kits alone, so conditions may stand there. */
function linesOf(parts: PlanPart[], wishes: Wishes): fc.Arbitrary<PlanLine[]> {
  const drafts: Draft[] = [];
  parts.forEach((part, parent) => {
    if (part.sourcing === "buy") return;
    for (let component = Math.max(parent + 1, KITS); component < parts.length; component++) {
      if (component < OPEN && parent >= OPEN) continue;
      drafts.push({ parent, component });
    }
  });
  const open = (at: number) =>
    at < KITS || (at < OPEN && parts.slice(KITS, at + 1).every((part) => part.sourcing === "phantom"));
  const line = ({ parent, component }: Draft) =>
    fc
      .record({
        quantity: fc.oneof(
          { weight: 12, arbitrary: steps(4, parts[component].decimals) },
          { weight: 1, arbitrary: fc.constant(null) },
        ),
        scrap:
          wishes.losses === false ? fc.constant("0") : fc.constantFrom("0", "0", "0.02", "0.5", "0.33333333"),
        rest: conditions(wishes.conditions !== false && open(parent)),
      })
      .map(({ quantity, scrap, rest }) =>
        buildLine({
          parent: parts[parent].partNumber,
          component: parts[component].partNumber,
          quantity,
          scrap,
          ...rest,
        }),
      );
  return fc
    .array(fc.nat({ max: drafts.length - 1 }), { minLength: parts.length, maxLength: parts.length * 2 })
    .chain((picks) => fc.tuple(...picks.map((at) => line(drafts[at]))));
}

/** A phantom without lines would pass its need to nobody. */
function withoutEmptyPhantoms(parts: PlanPart[], lines: PlanLine[]): PlanPart[] {
  const parents = new Set(lines.map((line) => line.parent));
  return parts.map((part) =>
    part.sourcing === "phantom" && !parents.has(part.partNumber)
      ? { ...part, sourcing: "buy" as const }
      : part,
  );
}

/** The options that a kit's own lines and those of the phantoms below it name. */
function offered(parts: PlanPart[], lines: PlanLine[], kit: string): string[] {
  const phantom = new Set(parts.filter((part) => part.sourcing === "phantom").map((part) => part.partNumber));
  const below = lines.filter((line) => line.parent === kit);
  const own = below.flatMap((line) => (line.option === null ? [] : [line.option]));
  const passed = below
    .filter((line) => phantom.has(line.component))
    .flatMap((line) => offered(parts, lines, line.component));
  return [...new Set([...own, ...passed])];
}

function demandsOf(parts: PlanPart[], lines: PlanLine[], wishes: Wishes): fc.Arbitrary<PlanDemand[]> {
  const demand = fc.constantFrom(0, 0, 0, 1, 1, 4).chain((at) =>
    fc
      .record({
        quantity: fc.integer({ min: 1, max: wishes.kits ?? 5 }).map(String),
        due: wishes.dates === false ? fc.constant(null) : fc.option(dateAround(0, 60), { freq: 2 }),
        options: fc.subarray(offered(parts, lines, NAMES[at])),
        serial: wishes.conditions === false ? fc.constant(null) : fc.constantFrom(null, "097", "099"),
      })
      .map(({ quantity, ...rest }) => buildDemand(NAMES[at], quantity, rest)),
  );
  return fc.array(demand, { minLength: 1, maxLength: wishes.demands ?? 3 });
}

function stockOf(parts: PlanPart[], wishes: Wishes) {
  const row = fc.nat({ max: parts.length - 1 }).chain((at) =>
    fc
      .record({
        quantity: steps(at >= OPEN ? 30 : 3, parts[at].decimals),
        expiresOn: wishes.expiry === false ? fc.constant(null) : fc.option(dateAround(-3, 60), { freq: 2 }),
        nowOnly: wishes.supply === false ? fc.constant(false) : fc.constantFrom(false, false, false, true),
      })
      .map(({ quantity, ...rest }) => buildStock(parts[at].partNumber, quantity, rest)),
  );
  return fc.array(row, { maxLength: parts.length * 2 });
}

function supplyOf(parts: PlanPart[], wishes: Wishes): fc.Arbitrary<PlanSupply[]> {
  if (wishes.supply === false) return fc.constant([]);
  const places = parts.flatMap((part, at) => (part.sourcing === "phantom" ? [] : [at]));
  const row = fc.constantFrom(...places).chain((at) =>
    fc
      .record({
        quantity: steps(at >= OPEN ? 20 : 3, parts[at].decimals),
        due: fc.option(dateAround(-10, 70), { freq: 6 }),
      })
      .map(({ quantity, due }) => buildSupply(parts[at].partNumber, quantity, due)),
  );
  return fc.array(row, { maxLength: parts.length });
}

/** A random shop: diamonds, shared parts, phantoms, and what `wishes` leaves in. */
export function randomShop(wishes: Wishes = {}): fc.Arbitrary<Shop> {
  return fc
    .integer({ min: 6, max: NAMES.length })
    .chain((count) => fc.tuple(...NAMES.slice(0, count).map((_, at) => partAt(at, count - 3, wishes))))
    .chain((parts) =>
      linesOf(parts, wishes).map((lines) => ({ parts: withoutEmptyPhantoms(parts, lines), lines })),
    )
    .map(({ parts, lines }) => {
      const bought = new Set(parts.filter((part) => part.sourcing === "buy").map((part) => part.partNumber));
      return { parts, lines: lines.filter((line) => !bought.has(line.parent)) };
    })
    .chain(({ parts, lines }) =>
      fc.record({
        parts: fc.constant(parts),
        lines: fc.constant(lines),
        stock: stockOf(parts, wishes),
        supply: supplyOf(parts, wishes),
        demand: demandsOf(parts, lines, wishes),
        sharing: fc.constant(wishes.release ? ("release" as const) : ("strict" as const)),
        today: fc.constant(TODAY),
      }),
    );
}
