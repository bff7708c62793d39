import { seededRandom } from "./random";

export interface Bin {
  code: string;
  zone: string;
  walkOrder: number;
  description: string;
}

interface Zone {
  letter: string;
  name: string;
  racks: number;
  levels: number;
  what: string;
  /** Part families kept here, by the letters of the number. */
  families: string[];
}

const ZONES: Zone[] = [
  { letter: "G", name: "Goods in", racks: 4, levels: 1, what: "Bench", families: [] },
  {
    letter: "A",
    name: "Small parts",
    racks: 14,
    levels: 6,
    what: "Drawer rack",
    families: [
      "FB",
      "FC",
      "FD",
      "FE",
      "FF",
      "FG",
      "FH",
      "FI",
      "FK",
      "FL",
      "FN",
      "FP",
      "FQ",
      "FR",
      "FS",
      "FT",
      "FW",
      "FX",
      "HC",
      "CE",
      "CI",
      "TM",
      "WM",
      "CN",
      "HS",
      "TY-W",
    ],
  },
  {
    letter: "B",
    name: "Drives",
    racks: 13,
    levels: 5,
    what: "Rack",
    families: ["HB", "CL", "BU", "BT", "LD", "TD", "FA", "PP", "EX", "CW"],
  },
  {
    letter: "C",
    name: "Controls, fuel and rudders",
    racks: 9,
    levels: 4,
    what: "Rack",
    families: ["CB", "CT", "FU", "RU", "DL"],
  },
  {
    letter: "D",
    name: "Electrical",
    racks: 12,
    levels: 4,
    what: "Rack",
    families: ["WR", "WL", "WH", "EL", "CD", "IP", "NL", "HT"],
  },
  { letter: "E", name: "Engine floor", racks: 4, levels: 1, what: "Floor bay", families: ["EN"] },
  {
    letter: "F",
    name: "Cloth",
    racks: 4,
    levels: 4,
    what: "Roll rack",
    families: ["GF", "CF", "TR", "CLOTH"],
  },
  {
    letter: "P",
    name: "Cutting room",
    racks: 6,
    levels: 4,
    what: "Shelf",
    families: ["PLY"],
  },
  {
    letter: "R",
    name: "Resin store",
    racks: 4,
    levels: 4,
    what: "Shelf",
    families: ["RS", "GC", "AD", "SG", "TL", "GR", "PT", "RG"],
  },
  { letter: "M", name: "Mouldings", racks: 9, levels: 3, what: "Cradle", families: ["HU", "DK", "DU", "TY"] },
  { letter: "S", name: "Skirt loft", racks: 8, levels: 3, what: "Rail", families: ["SK", "TH"] },
  {
    letter: "T",
    name: "Trim",
    racks: 6,
    levels: 3,
    what: "Rack",
    families: ["SE", "WS", "CP", "CV", "TR", "WB", "SF"],
  },
  {
    letter: "W",
    name: "Tube, timber and foam",
    racks: 5,
    levels: 4,
    what: "Arm rack",
    families: ["TU", "XT", "PW", "FM", "SL"],
  },
  {
    letter: "K",
    name: "Packing and papers",
    racks: 8,
    levels: 4,
    what: "Shelf",
    families: ["PB", "PK", "BL", "JG", "TK", "SP", "OP", "GD", "TF"],
  },
  { letter: "Q", name: "Held goods cage", racks: 2, levels: 2, what: "Cage shelf", families: [] },
  { letter: "Z", name: "Kit staging", racks: 8, levels: 1, what: "Floor bay", families: [] },
];

export const goodsInBins = ["G01", "G02", "G03", "G04"];
export const heldBins = ["Q01-1", "Q01-2", "Q02-1", "Q02-2"];

/** Every bin, in walking order: up one rack and down the next. */
export function layOutBins(): Bin[] {
  const bins: Bin[] = [];
  for (const zone of ZONES) {
    for (const code of codesOf(zone)) {
      const [rack, level] = code.slice(1).split("-");
      const where = level ? `${zone.what} ${Number(rack)}, level ${level}` : `${zone.what} ${Number(rack)}`;
      bins.push({ code, zone: zone.name, walkOrder: (bins.length + 1) * 10, description: where });
    }
  }
  return bins;
}

function codesOf(zone: Zone): string[] {
  const codes: string[] = [];
  for (let rack = 1; rack <= zone.racks; rack++) {
    for (let level = 1; level <= zone.levels; level++) {
      const code = `${zone.letter}${String(rack).padStart(2, "0")}`;
      codes.push(zone.levels === 1 ? code : `${code}-${level}`);
    }
  }
  return codes;
}

/** The home bin of each part given, neighbours in number being neighbours on the shelf. */
export function homeBins(partNumbers: readonly string[]): Map<string, string> {
  const homes = new Map<string, string>();
  for (const zone of ZONES.filter(({ families }) => families.length > 0)) {
    const kept = partNumbers.filter((partNumber) => zoneOf(partNumber) === zone).sort();
    const codes = codesOf(zone);
    for (const [index, partNumber] of kept.entries())
      homes.set(partNumber, codes[Math.floor((index * codes.length) / kept.length)]);
  }
  return homes;
}

/** Another bin of the same zone, for what does not fit at home. */
export function overflowBin(partNumber: string, home: string): string {
  const codes = codesOf(zoneOf(partNumber)).filter((code) => code !== home);
  return seededRandom(`${partNumber}/overflow`).pick(codes);
}

function zoneOf(partNumber: string): Zone {
  const family =
    /^[A-Z]{2}-\d{4}[LR]?-[PC]\d*$/.test(partNumber) && !partNumber.startsWith("W")
      ? "PLY"
      : partNumber.startsWith("TY-W")
        ? "TY-W"
        : partNumber.split("-")[0];
  const zone = ZONES.find(({ families }) => families.includes(family));
  if (!zone) throw new Error(`No zone keeps the family ${family}.`);
  return zone;
}
