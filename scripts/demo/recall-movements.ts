import type { Book, BookPart } from "./book";
import type { StockRow } from "./fill-shelves";
import { netNeed } from "./net-need";
import { numberReferences } from "./number-references";
import { packOf } from "./pack-of";
import { lastDay, lotDay, type MovementKind, type PastEvent, type Recalled, timeOf } from "./past-event";
import { issuesOf } from "./past-issues";
import { heldPast, receiptsOf } from "./past-receipts";
import { seededRandom } from "./random";
import { preferredSupplier, type Supplier } from "./trade-suppliers";

export interface PastMovement {
  happenedAt: string;
  kind: MovementKind;
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

/** A hundred weeks of movements that end in exactly the balances given. */
export function recallMovements(
  book: Book,
  rows: readonly StockRow[],
  suppliers: readonly Supplier[],
): PastMovement[] {
  const s2 = netNeed(book, [{ kit: "S2", quantity: 10 }], new Map());
  const s4 = netNeed(book, [{ kit: "S4", quantity: 10 }], new Map());
  const jobs = findJobs(book);
  const movements: PastMovement[] = [];
  for (const row of rows) {
    const { partNumber } = row;
    const part = book.part(partNumber);
    const recalled = {
      part,
      row,
      uses: { s2: (s2.get(partNumber) ?? 0) / 10, s4: (s4.get(partNumber) ?? 0) / 10 },
      job: jobs.get(partNumber) ?? partNumber,
      source: part.sourcing === "buy" ? preferredSupplier(part, suppliers).code : "",
      chances: seededRandom(`${nameOf(row)}/past`),
    };
    const events = row.state === "held" ? heldPast(recalled) : usablePast(recalled);
    for (const event of events) movements.push(written(row, event));
  }
  movements.sort((a, b) => compare(a.happenedAt, b.happenedAt) || compare(a.partNumber, b.partNumber));
  return numberReferences(movements);
}

/** Small cut parts go through on the order of what they are cut for. */
function findJobs(book: Book): Map<string, string> {
  const parents = new Map(book.lines.map((line) => [line.component, line.parent]));
  const jobs = new Map<string, string>();
  for (const partNumber of book.parts.keys()) {
    let job = parents.get(partNumber) ?? partNumber;
    while (book.part(job).leadTimeDays <= 2 && parents.has(job)) job = parents.get(job) ?? job;
    jobs.set(partNumber, job);
  }
  return jobs;
}

/** Walks back from the balance: an issue raises what was there before, a receipt lowers it, and the oldest receipt leaves nothing. */
function usablePast(recalled: Recalled): PastEvent[] {
  const { row, part, chances } = recalled;
  const events: PastEvent[] = [];
  const unit = packSteps(part, recalled.uses.s2);
  let there = row.steps;
  let next = lastDay;
  for (const event of issuesOf(recalled).reverse()) {
    const worth = Math.max(unit, Math.ceil((event.steps * (1.2 + chances.next() * 1.6)) / unit) * unit);
    while (row.lot === "" && there >= worth && next - event.day > 14 && chances.chance(0.62)) {
      next = chances.whole(event.day + 3, Math.min(next - 9, event.day + 90));
      events.push(...receiptsOf(recalled, next, worth));
      there -= worth;
    }
    const change = event.to === null ? event.steps : -event.steps;
    if (there + change < 0) continue;
    events.push(event);
    there += change;
    next = event.day;
  }
  if (there > 0)
    events.push(
      ...firstReceipt(
        recalled,
        there,
        row.lot === "" ? Math.max(0, next - chances.whole(2, 30)) : lotDay(row.lot),
        unit,
      ),
    );
  return events;
}

/** What stood there when the book was begun, or the first delivery of something newer, in whole packs. */
function firstReceipt(recalled: Recalled, steps: number, day: number, unit: number): PastEvent[] {
  const { row, job } = recalled;
  const here: [string, string] = [row.bin, "usable"];
  if (row.lot === "" && day < 40) {
    return [
      {
        day: 0,
        hour: 9,
        kind: "adjust",
        steps,
        reason: "Opening count",
        reference: "",
        from: null,
        to: here,
      },
    ];
  }
  const delivered = Math.ceil(steps / unit) * unit;
  const events = receiptsOf(recalled, day, delivered);
  if (delivered > steps) {
    const reference = `SO/${String(Math.floor(day / 7)).padStart(3, "0")}/${job}`;
    events.push({
      day: events[0].day,
      hour: 13,
      kind: "issue",
      steps: delivered - steps,
      reason: "",
      reference,
      from: here,
      to: null,
    });
  }
  return events;
}

/** A delivery is so many packs; loose goods come in round numbers. */
function packSteps(part: BookPart, uses: number): number {
  if (part.sourcing === "make") return 1;
  const { per } = packOf(part);
  if (per > 1 || part.decimals > 0) return Math.round(per * 10 ** part.decimals);
  if ((part.cost ?? 0) < 4) return uses > 20 ? 100 : uses > 5 ? 25 : 10;
  return (part.cost ?? 0) < 20 ? (uses > 5 ? 20 : 5) : 1;
}

/** Minutes of the hour given and of some that follow, so that not everything happens at eight. */
const SPREAD: Record<MovementKind, number> = {
  receive: 59,
  hold: 40,
  release: 59,
  move: 59,
  issue: 115,
  return: 100,
  scrap: 50,
  adjust: 45,
};

function written(row: StockRow, event: PastEvent): PastMovement {
  const minutes = seededRandom(`${nameOf(row)}/${event.day}/${event.kind}`).whole(0, SPREAD[event.kind]);
  const at = timeOf(event.day, event.hour) + minutes * 60_000;
  return {
    happenedAt: new Date(at).toISOString().replace(".000Z", "Z"),
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
  };
}

const nameOf = (row: StockRow) => `${row.partNumber}/${row.lot}/${row.bin}`;
const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
