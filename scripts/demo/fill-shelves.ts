import type { Book, BookPart } from "./book";
import { heldBins, homeBins, overflowBin } from "./lay-out-bins";
import { netNeed, type Wanted } from "./net-need";
import { packOf } from "./pack-of";
import { seededRandom } from "./random";
import { stoppers } from "./stoppers";

/** One balance of the firm's stock, in whole steps of the part. */
export interface StockRow {
  partNumber: string;
  bin: string;
  lot: string;
  state: "usable" | "held";
  steps: number;
  expiresOn: string;
}

/** Units kept built, the ones that matter to the ship check; the others are chosen by chance. */
const BUILT: Record<string, number> = {
  "CL-100": 3,
  "CL-110": 0,
  "BU-100": 5,
  "BU-110": 2,
  "LD-200": 3,
  "LD-210": 1,
  "LD-220": 0,
  "LD-240": 4,
  "FA-210": 4,
  "TD-300": 2,
  "TD-310": 4,
  "TD-320": 1,
  "TD-330": 3,
  "FA-220": 2,
  "FA-240": 0,
  "PP-100": 1,
  "PP-110": 5,
  "PP-120": 4,
  "PP-130": 3,
  "PP-140": 2,
  "DU-100": 2,
  "DU-200": 3,
  "RU-100": 0,
  "RU-130": 2,
  "CT-100": 1,
  "CT-110": 3,
  "FU-100": 1,
  "IP-100": 2,
  "WH-100": 1,
  "WH-110": 3,
  "WH-120": 2,
  "WH-130": 4,
  "WH-140": 3,
  "WH-150": 4,
  "WH-170": 3,
  "SE-100": 2,
  "WS-100": 3,
  "HU-110": 1,
  "HU-120": 3,
  "HU-130": 2,
  "DK-100": 1,
  "TY-100": 5,
  "SK-100": 0,
  "SK-110": 2,
  "SK-120": 1,
  "SK-130": 3,
  "SK-140": 2,
  "PB-110": 5,
  "TK-100": 6,
  "JG-100": 4,
  "SP-100": 3,
  "SF-100": 4,
  "PK-100": 1,
  "HU-410": 1,
  "DK-400": 1,
  "HU-420": 1,
  "SK-400": 1,
  "PK-400": 0,
  "CP-100": 2,
  "TF-100": 1,
  "NL-100": 2,
  "HT-100": 1,
  "SP-1002": 4,
};

/** What the open orders are likely to ask for, so that four-seat and option parts are on the shelves as well. */
const ORDERS_AHEAD: Wanted[] = [
  { kit: "S2", quantity: 6, serial: "031" },
  { kit: "S2", quantity: 1, serial: "029", options: ["HEATER", "NIGHT", "TRAILER"] },
  { kit: "S2", quantity: 3, serial: "036", options: ["CANOPY", "NIGHT", "COVER", "WHEELS", "HEATER"] },
  { kit: "S4", quantity: 3, options: ["CANOPY", "NIGHT", "HEATER", "WHEELS"] },
];

/** Goods that are there and do not count: held in the cage, or out of date. */
const OUT_OF_REACH: Omit<StockRow, "bin">[] = [
  { partNumber: "HB-2041", lot: "26-0466", state: "held", steps: 14, expiresOn: "" },
  { partNumber: "LD-2101", lot: "", state: "held", steps: 4, expiresOn: "" },
  { partNumber: "AD-310", lot: "26-0119", state: "usable", steps: 11_400, expiresOn: "2026-11-12" },
  { partNumber: "SK-0022", lot: "25-0467", state: "usable", steps: 2_350, expiresOn: "2026-10-30" },
  { partNumber: "GC-211", lot: "26-0042", state: "usable", steps: 3_600, expiresOn: "2026-09-30" },
  { partNumber: "RS-120", lot: "26-0057", state: "held", steps: 2_500, expiresOn: "2027-02-28" },
  { partNumber: "IP-1013", lot: "", state: "held", steps: 2, expiresOn: "" },
  { partNumber: "DK-1010", lot: "", state: "held", steps: 1, expiresOn: "" },
  { partNumber: "CW-1410", lot: "", state: "held", steps: 1, expiresOn: "" },
  { partNumber: "FA-2103", lot: "", state: "held", steps: 6, expiresOn: "" },
  { partNumber: "FU-1010", lot: "", state: "held", steps: 1, expiresOn: "" },
];

export function fillShelves(book: Book): StockRow[] {
  const usable = chooseUsable(book);
  const homes = homeBins(
    [...book.parts.keys()].filter(
      (partNumber) => book.part(partNumber).sourcing !== "phantom" && !book.part(partNumber).sold,
    ),
  );
  const rows: StockRow[] = [];
  for (const [partNumber, steps] of usable)
    if (steps > 0) rows.push(...shelve(book.part(partNumber), steps, homes.get(partNumber) ?? ""));
  for (const [index, row] of OUT_OF_REACH.entries()) {
    rows.push({
      ...row,
      bin: row.state === "held" ? heldBins[index % heldBins.length] : (homes.get(row.partNumber) ?? ""),
    });
  }
  return rows.sort(
    (a, b) => compare(a.partNumber, b.partNumber) || compare(a.lot, b.lot) || compare(a.bin, b.bin),
  );
}

function chooseUsable(book: Book): Map<string, number> {
  const built = chooseBuilt(book);
  const needs = new Map(
    [6, 7, 8, 9, 10].map((kits) => [kits, netNeed(book, [{ kit: "S2", quantity: kits }], built)]),
  );
  const ahead = netNeed(book, ORDERS_AHEAD, built);
  const usable = new Map(built);
  for (const part of book.parts.values()) {
    if (part.sourcing !== "buy") continue;
    const need = (kits: number) => needs.get(kits)?.get(part.partNumber) ?? 0;
    const stopper = stoppers.find(({ partNumber }) => partNumber === part.partNumber);
    if (stopper) {
      const enough = need(stopper.stopsAt - 1);
      usable.set(part.partNumber, enough + Math.floor((need(stopper.stopsAt) - enough) * stopper.nearly));
    } else usable.set(part.partNumber, ample(part, need(10), ahead.get(part.partNumber) ?? 0));
  }
  usable.set("RU-2210L", 12);
  usable.set("GR-01", 0);
  return usable;
}

function chooseBuilt(book: Book): Map<string, number> {
  const one = netNeed(book, [{ kit: "S2", quantity: 1 }], new Map());
  const built = new Map<string, number>();
  for (const part of book.parts.values()) {
    if (part.sourcing !== "make" || part.sold) continue;
    const chances = seededRandom(`${part.partNumber}/built`);
    const uses = one.get(part.partNumber) ?? 1;
    const kits = chances.pick(part.leadTimeDays <= 1 ? [0, 0, 1, 2, 3, 4, 6, 8] : [0, 1, 1, 2, 3, 4, 5]);
    const odd = kits > 0 && chances.chance(0.3) ? chances.whole(0, uses) : 0;
    built.set(part.partNumber, BUILT[part.partNumber] ?? Math.max(0, kits * uses + odd));
  }
  return built;
}

/** Enough for ten kits and for the orders ahead, and as uneven as life. */
function ample(part: BookPart, ten: number, ahead: number): number {
  const chances = seededRandom(`${part.partNumber}/stock`);
  const need = Math.max(ten, ahead);
  const cost = part.cost ?? 0;
  if (need === 0) return chances.whole(2, 9) * 10 ** part.decimals;
  const over =
    cost > 60 ? chances.next() * 0.12 : cost > 8 ? 0.03 + chances.next() * 0.3 : 0.1 + chances.next() * 0.9;
  const target = Math.ceil(need * (1 + over));
  const { per } = packOf(part);
  const loose = chances.whole(0, Math.max(0, Math.floor(Math.min(per * 10 ** part.decimals, need) * 0.4)));
  return part.decimals > 0 ? Math.ceil((target + loose) / 50) * 50 : target + (cost < 1 ? loose : 0);
}

function shelve(part: BookPart, steps: number, home: string): StockRow[] {
  const chances = seededRandom(`${part.partNumber}/shelf`);
  const row = { partNumber: part.partNumber, state: "usable" as const };
  if (part.lotted) {
    const younger = steps > 3 ? Math.floor(steps * (0.3 + chances.next() * 0.4)) : 0;
    const lots = [steps - younger, younger].filter((share) => share > 0);
    return lots.map((share, index) => ({
      ...row,
      bin: home,
      lot: `26-0${chances.whole(120 + index * 190, 290 + index * 190)}`,
      steps: share,
      expiresOn: expiryOf(part, index, chances.whole(1, 28)),
    }));
  }
  if (steps > 40 && chances.chance(0.12)) {
    const share = Math.floor(steps * (0.2 + chances.next() * 0.3));
    return [
      { ...row, bin: home, lot: "", steps: steps - share, expiresOn: "" },
      { ...row, bin: overflowBin(part.partNumber, home), lot: "", steps: share, expiresOn: "" },
    ];
  }
  return [{ ...row, bin: home, lot: "", steps, expiresOn: "" }];
}

function expiryOf(part: BookPart, index: number, day: number): string {
  if (part.trade === "bear" || part.trade === "cast") return "";
  const months = part.trade === "resin" ? [4, 7] : [5, 10];
  return `2027-${String(months[index]).padStart(2, "0")}-${String(day).padStart(2, "0")}`;
}

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);
