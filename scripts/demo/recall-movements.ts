import type { Book, BookPart } from "./book";
import type { StockRow } from "./fill-shelves";
import { goodsInBins } from "./lay-out-bins";
import { netNeed } from "./net-need";
import { packOf } from "./pack-of";
import { type Random, seededRandom } from "./random";
import { preferredSupplier, type Supplier } from "./trade-suppliers";

export interface PastMovement {
  happenedAt: string;
  kind: "receive" | "return" | "issue" | "scrap" | "move" | "hold" | "release" | "adjust";
  partNumber: string;
  lot: string;
  fromBin: string;
  fromState: string;
  toBin: string;
  toState: string;
  steps: number;
  reason: string;
  reference: string;
}

/** A change to one balance; `day` counts from the start of the history, `hour` orders within it. */
interface Event {
  day: number;
  hour: number;
  kind: PastMovement["kind"];
  steps: number;
  reason: string;
  reference: string;
  from: [string, string] | null;
  to: [string, string] | null;
}

const FIRST_DAY = Date.UTC(2024, 11, 30);
const LAST = 699;
/** Days on which a batch of kits was started, with the number of kits. */
const S2_BATCHES: [number, number][] = [
  [38, 5],
  [157, 5],
  [276, 5],
  [388, 5],
  [507, 4],
  [612, 4],
];
const S4_BATCHES: [number, number][] = [
  [101, 2],
  [339, 2],
  [563, 2],
  [668, 2],
];
const VARIANCES = [
  "Count, cause not found",
  "Count, bag torn, pieces found under rack",
  "Count, issued without paper",
  "Count, two parts mixed in one drawer",
];
const SCRAPS = [
  "Dropped, thread damaged",
  "Scratched in handling",
  "Crazed on unpacking",
  "Cut to the wrong length",
  "Failed bench check",
];

/** A hundred weeks of movements that end in exactly the balances given. */
export function recallMovements(
  book: Book,
  rows: readonly StockRow[],
  suppliers: readonly Supplier[],
): PastMovement[] {
  const s2 = netNeed(book, [{ kit: "S2", quantity: 1 }], new Map());
  const s4 = netNeed(book, [{ kit: "S4", quantity: 1 }], new Map());
  const parents = new Map(book.lines.map((line) => [line.component, line.parent]));
  const references = new References();
  const movements: (PastMovement & { order: string })[] = [];
  for (const row of rows) {
    const part = book.part(row.partNumber);
    const uses = { s2: s2.get(row.partNumber) ?? 0, s4: s4.get(row.partNumber) ?? 0 };
    const source = part.sourcing === "buy" ? preferredSupplier(part, suppliers).code : "";
    const context = {
      part,
      row,
      uses,
      parent: parents.get(row.partNumber) ?? "S2",
      source,
      references,
      chances: seededRandom(`${row.partNumber}/${row.lot}/${row.bin}/past`),
    };
    for (const event of pastOf(context)) movements.push(written(row, event));
  }
  movements.sort((a, b) => (a.order < b.order ? -1 : a.order > b.order ? 1 : 0));
  return references.number(movements);
}

interface Context {
  part: BookPart;
  row: StockRow;
  uses: { s2: number; s4: number };
  parent: string;
  source: string;
  references: References;
  chances: Random;
}

function pastOf(context: Context): Event[] {
  return context.row.state === "held" ? pastOfHeld(context) : pastOfUsable(context);
}

/** Received, put away, found wanting, carried to the cage. */
function pastOfHeld({ part, row, source, chances }: Context): Event[] {
  const day = 700 - chances.whole(12, 60);
  const bench = goodsInBins[day % 4];
  const reference = part.sourcing === "buy" ? buyReference(day, source) : makeReference(day, part.partNumber);
  return [
    {
      day,
      hour: 8,
      kind: "receive",
      steps: row.steps,
      reason: "",
      reference,
      from: null,
      to: [bench, "usable"],
    },
    {
      day,
      hour: 11,
      kind: "move",
      steps: row.steps,
      reason: "To the cage",
      reference: "",
      from: [bench, "usable"],
      to: [row.bin, "usable"],
    },
    {
      day,
      hour: 12,
      kind: "hold",
      steps: row.steps,
      reason: HELD_FOR[part.partNumber] ?? "Waits for inspection",
      reference: "",
      from: [row.bin, "usable"],
      to: [row.bin, "held"],
    },
  ];
}

const HELD_FOR: Record<string, string> = {
  "HB-2041": "Rough when turned by hand, cage loose; supplier asked",
  "LD-2101": "Porous at the seal bore, casting shown to foundry",
  "RS-120": "Bottle neck wet, cap not sealed",
  "IP-1013": "Calibration slip missing",
  "DK-1010": "Void by left hatch flange, to be filled or scrapped",
  "CW-1410": "Fins bent in transit, pressure test first",
  "FA-2103": "Set out of balance by more than 2 g",
  "FU-1010": "Sender boss out of true",
};

/** Walks back from the balance: an issue raises what was there before, a receipt lowers it, and the oldest receipt leaves nothing. */
function pastOfUsable(context: Context): Event[] {
  const { row, part, chances } = context;
  const events: Event[] = [];
  const unit = packSteps(part);
  let there = row.steps;
  let arrived = LAST;
  for (const issue of issuesOf(context).reverse()) {
    const worth = Math.max(unit, Math.ceil((issue.steps * (1.2 + chances.next() * 1.6)) / unit) * unit);
    while (there >= worth && arrived - issue.day > 14 && chances.chance(0.62)) {
      arrived = chances.whole(issue.day + 3, Math.min(arrived - 1, issue.day + 90));
      events.push(...received(context, arrived, worth));
      there -= worth;
      if (arrived - issue.day <= 10) break;
    }
    events.push(issue);
    there += issue.kind === "return" || issue.to !== null ? -issue.steps : issue.steps;
    arrived = issue.day;
  }
  if (there > 0) events.push(...opening(context, there, Math.max(0, arrived - chances.whole(2, 30))));
  return events;
}

function issuesOf(context: Context): Event[] {
  const { row, uses, chances, parent } = context;
  const share = row.lot === "" ? 1 : 0.4;
  const first = row.lot === "" ? 0 : 500;
  const batches = [
    ...S2_BATCHES.map(([day, kits]) => [day, kits * uses.s2]),
    ...S4_BATCHES.map(([day, kits]) => [day, kits * uses.s4]),
  ].sort((a, b) => a[0] - b[0]);
  const events: Event[] = [];
  for (const [start, steps] of batches) {
    const amount = Math.round(steps * share);
    if (amount === 0 || start < first || chances.chance(0.14)) continue;
    const day = workday(start + chances.whole(0, 9));
    events.push({
      day,
      hour: 13,
      kind: "issue",
      steps: amount,
      reason: "",
      reference: makeReference(start, parent),
      from: [row.bin, "usable"],
      to: null,
    });
    if (chances.chance(0.03))
      events.push({
        day: day + 1,
        hour: 14,
        kind: "scrap",
        steps: Math.max(1, Math.round(amount * 0.05)),
        reason: chances.pick(SCRAPS),
        reference: makeReference(start, parent),
        from: [row.bin, "usable"],
        to: null,
      });
  }
  if (events.length === 0 && uses.s2 + uses.s4 > 0 && chances.chance(0.5)) {
    const day = workday(chances.whole(first + 40, 690));
    events.push({
      day,
      hour: 13,
      kind: "issue",
      steps: Math.max(uses.s2, uses.s4),
      reason: "Spares order",
      reference: makeReference(day, parent),
      from: [row.bin, "usable"],
      to: null,
    });
  }
  if (chances.chance(0.09)) {
    const day = workday(chances.whole(Math.max(first, 620), 692));
    events.push({
      day,
      hour: 15,
      kind: "adjust",
      steps: Math.max(1, Math.round(row.steps * 0.02)),
      reason: chances.pick(VARIANCES),
      reference: "",
      from: [row.bin, "usable"],
      to: null,
    });
  }
  return events.sort((a, b) => a.day - b.day || a.hour - b.hour);
}

function received({ part, row, source, chances }: Context, onDay: number, steps: number): Event[] {
  const day = workday(onDay);
  const reference = part.sourcing === "buy" ? buyReference(day, source) : makeReference(day, part.partNumber);
  const here: [string, string] = [row.bin, "usable"];
  if (part.sourcing === "make" || chances.chance(0.75))
    return [{ day, hour: 8, kind: "receive", steps, reason: "", reference, from: null, to: here }];
  const bench: [string, string] = [goodsInBins[day % 4], "usable"];
  return [
    { day, hour: 8, kind: "receive", steps, reason: "", reference, from: null, to: bench },
    { day, hour: 10, kind: "move", steps, reason: "Put away", reference: "", from: bench, to: here },
  ];
}

/** What stood there when the book was begun, or the first delivery of something newer. */
function opening(context: Context, steps: number, day: number): Event[] {
  if (context.row.lot === "" && day < 40) {
    return [
      {
        day: 0,
        hour: 9,
        kind: "adjust",
        steps,
        reason: "Opening count",
        reference: "",
        from: null,
        to: [context.row.bin, "usable"],
      },
    ];
  }
  return received(context, day, steps);
}

function packSteps(part: BookPart): number {
  return part.sourcing === "make" ? 1 : Math.round(packOf(part).per * 10 ** part.decimals);
}

const workday = (day: number) => Math.max(0, day - Math.max(0, (day % 7) - 4));
const buyReference = (day: number, supplier: string) =>
  `PO/${String(Math.floor(day / 7)).padStart(3, "0")}/${supplier}`;
const makeReference = (day: number, part: string) =>
  `SO/${String(Math.floor(day / 7)).padStart(3, "0")}/${part}`;

function written(row: StockRow, event: Event): PastMovement & { order: string } {
  const minute = seededRandom(`${row.partNumber}/${row.lot}/${row.bin}/${event.day}/${event.kind}`).whole(
    0,
    59,
  );
  const happenedAt = `${new Date(FIRST_DAY + event.day * 86_400_000).toISOString().slice(0, 10)}T${String(event.hour).padStart(2, "0")}:${String(minute).padStart(2, "0")}:00Z`;
  return {
    happenedAt,
    kind: event.kind,
    partNumber: row.partNumber,
    lot: row.lot,
    fromBin: event.from?.[0] ?? "",
    fromState: event.from?.[1] ?? "",
    toBin: event.to?.[0] ?? "",
    toState: event.to?.[1] ?? "",
    steps: event.steps,
    reason: event.reason,
    reference: event.reference,
    order: `${happenedAt}/${row.partNumber}/${row.lot}/${row.bin}`,
  };
}

/** Gives the orders of the past running numbers, year by year, in the order in which they were first met. */
class References {
  private readonly known = new Map<string, string>();
  private readonly last = new Map<string, number>();

  number(movements: (PastMovement & { order: string })[]): PastMovement[] {
    return movements.map(({ order: _order, ...movement }) => ({
      ...movement,
      reference: this.name(movement.reference, movement.happenedAt.slice(2, 4)),
    }));
  }

  private name(reference: string, year: string): string {
    if (reference === "") return "";
    const known = this.known.get(reference);
    if (known) return known;
    const series = `${reference.slice(0, 2)}-${year}`;
    const next = (this.last.get(series) ?? 0) + 1;
    this.last.set(series, next);
    const name = `${series}${String(next).padStart(3, "0")}`;
    this.known.set(reference, name);
    return name;
  }
}
