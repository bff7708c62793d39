import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanStock } from "~/domain/planning/types";
import { formatSteps } from "~/domain/quantity/format-steps";
import { parseSteps, requireSteps } from "~/domain/quantity/parse-steps";
import { addSteps, leastSteps, type Steps, subtractSteps } from "~/domain/quantity/steps";
import type { BookChange } from "~/schemas/planning/effects";
import type { StoredLots } from "./read-lots.server";
import { refuseChange } from "./refuse-change";

type ShelfChange = Pick<BookChange, "stock" | "hold" | "release">;

/**
 * Usable stock as it would be: lots held, lots released, then pieces added and taken away in the order given.
 * Stock in other states than usable counts for nothing. Where no lot is named, the lots that expire last are
 * taken first, so that the plan counts on nothing it may not have. The rows given stay as they are.
 */
export function changeShelves(
  structure: Structure,
  usable: readonly PlanStock[],
  change: ShelfChange,
  lots: StoredLots,
): PlanStock[] {
  const rows = [...usable];
  change.hold.forEach((one, at) => {
    decimalsOf(structure, one.partNumber, `hold.${at}`);
    holdLots(rows, one, `hold.${at}`);
  });
  change.release.forEach((one, at) => {
    decimalsOf(structure, one.partNumber, `release.${at}`);
    rows.push(...releasedLots(one, lots, `release.${at}`));
  });
  change.stock.forEach((one, at) => {
    const place = `stock.${at}`;
    const decimals = decimalsOf(structure, one.partNumber, place);
    const steps = parseSteps(one.change.replace(/^[+-]/, ""), decimals);
    if (!steps.ok) {
      const message = `${one.change} does not fit: ${one.partNumber} is counted with ${decimals} decimals.`;
      throw refuseChange(`${place}.change`, one.change, message);
    }
    if (one.state !== "usable" || steps.steps === 0) return;
    if (one.change.startsWith("-")) takeAway(rows, { ...one, steps: steps.steps, decimals, place });
    else putThere(rows, one, formatSteps(steps.steps, decimals), lots);
  });
  return rows;
}

function decimalsOf(structure: Structure, partNumber: string, place: string): number {
  const number = structure.numberOf.get(partKey(partNumber));
  if (number !== undefined) return structure.decimals[number];
  throw refuseChange(`${place}.partNumber`, partNumber, `There is no part ${partNumber} in the book.`);
}

function isOf(row: PlanStock, { partNumber, lot }: { partNumber: string; lot: string | null }): boolean {
  return partKey(row.partNumber) === partKey(partNumber) && (lot === null || (row.lot ?? "") === lot);
}

function holdLots(rows: PlanStock[], lot: BookChange["hold"][number], place: string): void {
  const left = rows.filter((row) => !isOf(row, lot));
  if (lot.lot !== null && left.length === rows.length) {
    const message = `No usable stock of ${lot.partNumber} is of lot ${lot.lot}.`;
    throw refuseChange(`${place}.lot`, lot.lot, message);
  }
  rows.splice(0, rows.length, ...left);
}

function releasedLots(
  { partNumber, lot }: BookChange["release"][number],
  lots: StoredLots,
  place: string,
): PlanStock[] {
  const released = (lots.get(partKey(partNumber)) ?? []).flatMap(({ lot: code, expiresOn, held }) =>
    held !== null && (lot === null || code === lot)
      ? [{ partNumber, quantity: held, expiresOn, lot: code }]
      : [],
  );
  if (released.length > 0) return released;
  const which = lot === null ? "" : ` of lot ${lot}`;
  throw refuseChange(place, partNumber, `No ${partNumber}${which} is held.`);
}

interface Taking {
  partNumber: string;
  lot: string | null;
  steps: Steps;
  decimals: number;
  place: string;
}

function takeAway(rows: PlanStock[], { partNumber, lot, steps, decimals, place }: Taking): void {
  const own = rows.filter((row) => isOf(row, { partNumber, lot })).sort(lastToExpireFirst);
  let left = steps;
  let available: Steps = 0;
  for (const row of own) {
    const here = requireSteps(row.quantity, decimals);
    const taken = leastSteps(left, here);
    available = addSteps(available, here);
    left = subtractSteps(left, taken);
    const rest = subtractSteps(here, taken);
    const at = rows.indexOf(row);
    if (rest > 0) rows[at] = { ...row, quantity: formatSteps(rest, decimals) };
    else rows.splice(at, 1);
  }
  if (!(left > 0)) return;
  const message = `There are only ${formatSteps(available, decimals)} of ${partNumber} to take away.`;
  throw refuseChange(`${place}.change`, partNumber, message);
}

/** A lot keeps its expiry date unless the change gives one, which then counts for all of the lot. */
function putThere(
  rows: PlanStock[],
  { partNumber, lot, expiresOn }: BookChange["stock"][number],
  quantity: string,
  lots: StoredLots,
): void {
  const code = lot ?? "";
  const stored = lots.get(partKey(partNumber))?.find((one) => one.lot === code);
  const until = expiresOn ?? stored?.expiresOn ?? null;
  rows.forEach((row, at) => {
    if (isOf(row, { partNumber, lot: code })) rows[at] = { ...row, expiresOn: until };
  });
  rows.push({ partNumber, quantity, expiresOn: until, lot: code });
}

function lastToExpireFirst(a: PlanStock, b: PlanStock): number {
  const [left, right] = [a.expiresOn ?? "9999-12-31", b.expiresOn ?? "9999-12-31"];
  return left < right ? 1 : left > right ? -1 : 0;
}
