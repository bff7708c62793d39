import {
  goodsIn,
  lotDay,
  type PastEvent,
  type Place,
  type Recalled,
  sourceReference,
  workday,
} from "./past-event";

/** A delivery or a finished build: straight to its bin, by way of goods in, or held there until it was looked at. */
export function receiptsOf(recalled: Recalled, onDay: number, steps: number): PastEvent[] {
  const { part, row, chances } = recalled;
  const day = workday(onDay);
  const here: Place = [row.bin, "usable"];
  const bench = goodsIn(day);
  const received = {
    day,
    hour: 8,
    kind: "receive" as const,
    steps,
    reason: "",
    reference: sourceReference(recalled, day),
    from: null,
  };
  const put = { day, kind: "move" as const, steps, reason: "Put away", reference: "", from: bench, to: here };
  if (part.sourcing === "make" || chances.chance(0.72)) return [{ ...received, to: here }];
  if (chances.chance(0.9))
    return [
      { ...received, to: bench },
      { ...put, hour: 10 },
    ];
  const held: Place = [bench[0], "held"];
  return [
    { ...received, to: bench },
    {
      day,
      hour: 9,
      kind: "hold",
      steps,
      reason: "Waits for inspection",
      reference: "",
      from: bench,
      to: held,
    },
    {
      day,
      hour: 10,
      kind: "release",
      steps,
      reason: "Looked at, good",
      reference: "",
      from: held,
      to: bench,
    },
    { ...put, hour: 11 },
  ];
}

/** Received, carried to the cage and held there. */
export function heldPast(recalled: Recalled): PastEvent[] {
  const { part, row, chances } = recalled;
  const day = row.lot === "" ? workday(700 - chances.whole(12, 60)) : lotDay(row.lot);
  const bench = goodsIn(day);
  const cage: Place = [row.bin, "usable"];
  const reason = HELD_FOR[part.partNumber] ?? "Waits for inspection";
  const { steps } = row;
  return [
    {
      day,
      hour: 8,
      kind: "receive",
      steps,
      reason: "",
      reference: sourceReference(recalled, day),
      from: null,
      to: bench,
    },
    { day, hour: 11, kind: "move", steps, reason: "To the cage", reference: "", from: bench, to: cage },
    { day, hour: 12, kind: "hold", steps, reason, reference: "", from: cage, to: [row.bin, "held"] },
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
