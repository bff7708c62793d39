import {
  dayOf,
  jobReference,
  lastDay,
  lotDay,
  type PastEvent,
  type Place,
  type Recalled,
  workday,
} from "./past-event";

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
  "Count, bag torn, pieces found under the rack",
  "Count, issued without paper",
  "Count, two parts mixed in one drawer",
];
const SCRAPS = [
  "Dropped, edge damaged",
  "Scratched in handling",
  "Cracked on unpacking",
  "Spoiled at the bench",
  "Failed bench check",
];

/** What went out of a balance: to batches of kits, for spares, spoiled, missed at a count; with what came back from the bench. In order. */
export function issuesOf(recalled: Recalled): PastEvent[] {
  const { row, uses, chances, job } = recalled;
  const here: Place = [row.bin, "usable"];
  const isLot = row.lot !== "";
  const first = isLot ? lotDay(row.lot) + 4 : 0;
  const last = row.expiresOn === "" ? lastDay : Math.min(lastDay, dayOf(row.expiresOn));
  const out = { from: here, to: null, reason: "" };
  const events: PastEvent[] = [];
  for (const [start, taken] of batchesOf(uses)) {
    const steps = Math.round(taken * (isLot ? 0.4 : 1));
    if (steps === 0 || start < first || start + 9 > last || chances.chance(0.14)) continue;
    const day = workday(start + chances.whole(0, 9));
    const reference = jobReference(start, job);
    const few = Math.max(1, Math.round(steps * 0.05));
    events.push({ ...out, day, hour: 13, kind: "issue", steps, reference });
    if (chances.chance(0.03))
      events.push({
        ...out,
        day,
        hour: 15,
        kind: "scrap",
        steps: few,
        reason: chances.pick(SCRAPS),
        reference,
      });
    else if (steps > 3 && chances.chance(0.05))
      events.push({
        day: workday(day + 5),
        hour: 9,
        kind: "return",
        steps: few,
        reason: "Left over at the bench",
        reference,
        from: null,
        to: here,
      });
  }
  if (events.length === 0 && last > 690 && uses.s2 + uses.s4 > 0 && chances.chance(0.5)) {
    const day = workday(chances.whole(Math.max(first, Math.min(first + 40, 680)), 695));
    events.push({
      ...out,
      day,
      hour: 13,
      kind: "issue",
      steps: Math.ceil(Math.max(uses.s2, uses.s4)),
      reason: recalled.part.decimals > 0 ? "Repair work" : "Sold as spares",
      reference: "",
    });
  }
  if (chances.chance(0.09)) {
    const day = workday(chances.whole(Math.max(first, 620), 694));
    events.push({
      ...out,
      day,
      hour: 16,
      kind: "adjust",
      steps: Math.max(1, Math.round(row.steps * 0.02)),
      reason: chances.pick(VARIANCES),
      reference: "",
    });
  }
  return events.sort((a, b) => a.day - b.day || a.hour - b.hour);
}

function batchesOf(uses: Recalled["uses"]): [number, number][] {
  const s2 = S2_BATCHES.map(([day, kits]): [number, number] => [day, kits * uses.s2]);
  const s4 = S4_BATCHES.map(([day, kits]): [number, number] => [day, kits * uses.s4]);
  return [...s2, ...s4].sort((a, b) => a[0] - b[0]);
}
