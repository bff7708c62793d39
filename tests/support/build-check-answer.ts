import type { Rung, Shortage } from "~/domain/planning/types";
import type { CheckPageAnswer, CheckPart } from "~/schemas/planning/check-answer";

/** Kits for which a part suffices, and how many of it each further kit lacks. */
interface Scarce {
  partNumber: string;
  stopsAt: number;
  perKit: number;
  readyOn?: string;
}

interface Options {
  quantity?: number;
  scarce?: Scarce[];
  buildable?: number | null;
  due?: string | null;
  seesCosts?: boolean;
  /** Date by kit; others are ready on the last one given. */
  readyOn?: Record<number, string>;
  cost?: string;
}

const BEARING: Scarce = { partNumber: "HB-2041", stopsAt: 8, perKit: 2 };

/** An answer of Check as the server gives it: ten S2, seven ready, unless told otherwise. */
export function buildCheckAnswer({
  quantity = 10,
  scarce = [BEARING],
  buildable = Math.min(...scarce.map((one) => one.stopsAt), 1_000_001) - 1,
  due = null,
  seesCosts = true,
  readyOn = { 8: "2027-01-20", 10: "2027-03-14" },
  cost = "1731.85",
}: Options = {}): CheckPageAnswer {
  const ladder = Array.from({ length: quantity }, (_, place) => rung(place + 1));
  const top = ladder[quantity - 1];

  function rung(kits: number): Rung {
    const stoppers = scarce
      .filter((one) => one.stopsAt <= kits)
      .map((one) => ({ partNumber: one.partNumber, missing: String(one.perKit * (kits - one.stopsAt + 1)) }));
    const days = Object.entries(readyOn).filter(([from]) => Number(from) <= kits);
    return {
      partNumber: "S2",
      kits,
      cost: seesCosts ? (stoppers.length > 0 ? cost : "0.00") : null,
      readyOn: days.at(-1)?.[1] ?? "2026-12-01",
      stoppers,
    };
  }

  return {
    question: { kit: "S2", quantity, by: due, options: [], ifs: [] },
    problem: null,
    readyByDate: null,
    ifs: [],
    without: null,
    kits: [
      { partNumber: "S2", description: "Two-seat craft", options: [{ code: "CAB", description: "Cabin" }] },
      { partNumber: "S4", description: "Four-seat craft", options: [] },
    ],
    stoppers: scarce.filter((one) => one.stopsAt <= quantity).map((one) => one.partNumber),
    totalParts: 1812,
    seesCosts,
    parts: [...scarce.map((one) => buildCheckPart({ partNumber: one.partNumber })), buildCheckPart()],
    answer: {
      today: "2026-12-01",
      demand: [
        {
          partNumber: "S2",
          quantity: String(quantity),
          due,
          options: [],
          serial: null,
          buildable,
          earliest: top.readyOn,
        },
      ],
      buildable: { S2: buildable },
      earliest: { S2: top.readyOn },
      ladder,
      shortages: top.stoppers.map((stopper) => shortage(stopper, scarce)),
      builds: [],
      criticalChain: [
        { partNumber: "S2", why: "build", readyOn: top.readyOn },
        { partNumber: "HB-2041", why: "buy", readyOn: "2027-03-10" },
      ],
      warnings: [],
    },
  };
}

function shortage(stopper: Rung["stoppers"][number], scarce: Scarce[]): Shortage {
  const one = scarce.find((part) => part.partNumber === stopper.partNumber);
  return {
    ...stopper,
    unit: "EA",
    gross: "20",
    fromStock: "14",
    onOrder: "0",
    short: stopper.missing,
    stopsAt: one?.stopsAt ?? 1,
    needBy: null,
    orderBy: "2026-12-01",
    readyOn: one?.readyOn ?? "2027-01-10",
  };
}

/** A bought part that the answer speaks of. */
export function buildCheckPart(overrides: Partial<CheckPart> = {}): CheckPart {
  return {
    partNumber: "S2",
    description: "Bearing, fan hub, sealed",
    sourcing: "buy",
    hasLaterOrders: false,
    unit: "EA",
    decimals: 0,
    supplier: "Northquay Bearings",
    leadTimeDays: 40,
    unitCost: "68.75",
    cost: "412.50",
    ...overrides,
  };
}
