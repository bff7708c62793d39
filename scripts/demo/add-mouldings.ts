import type { Book } from "./book";
import { seededRandom } from "./random";

const CLOTHS: Record<string, { partNumber: string; name: string; grams: number; glassToResin: number }> = {
  TS: { partNumber: "GF-2030", name: "tissue", grams: 30, glassToResin: 3 },
  M3: { partNumber: "GF-2300", name: "mat 300", grams: 300, glassToResin: 1.9 },
  T2: { partNumber: "GF-3200", name: "twill 200", grams: 200, glassToResin: 0.8 },
  T3: { partNumber: "GF-3300", name: "twill 300", grams: 300, glassToResin: 0.8 },
  B4: { partNumber: "GF-4400", name: "biaxial 400", grams: 400, glassToResin: 0.75 },
  B6: { partNumber: "GF-4600", name: "biaxial 600", grams: 600, glassToResin: 0.75 },
  K1: { partNumber: "GF-5170", name: "aramid 170", grams: 170, glassToResin: 0.9 },
  C2: { partNumber: "CF-3200", name: "carbon 200", grams: 200, glassToResin: 0.8 },
};
const PLACES = ["full", "full", "forward", "aft", "keel and corners", "flange", "centre"];
const SHARES: Record<string, number> = {
  full: 1,
  forward: 0.54,
  aft: 0.54,
  "keel and corners": 0.38,
  flange: 0.24,
  centre: 0.46,
};

/** Moulded parts: gelcoat, ply pack, core, resin and catalyst by weight, and the films that go to waste. A line is `NUMBER Name | m2 | cloths | core mm:m2 colour`. */
export function addMouldings(book: Book, text: string): void {
  for (const raw of text.split("\n").filter(Boolean)) {
    const [head, areaText, cloths, finish] = raw.split("|").map((piece) => piece.trim());
    const space = head.indexOf(" ");
    const [core, colour] = finish.split(" ");
    addMoulding(book, {
      partNumber: head.slice(0, space),
      name: head.slice(space + 1),
      area: Number(areaText),
      cloths: cloths.split(" "),
      core,
      colour,
    });
  }
}

interface Moulding {
  partNumber: string;
  name: string;
  area: number;
  cloths: string[];
  core: string;
  colour: string;
}

function addMoulding(book: Book, moulding: Moulding): void {
  const { partNumber, name, area } = moulding;
  const isTray = partNumber.startsWith("TY");
  const chances = seededRandom(`${partNumber}/yield`);
  book.add({
    partNumber,
    description: `${name}, moulded`,
    sourcing: "make",
    leadTimeDays: area > 1 ? 3 : 2,
    yield: isTray ? 0.98 : chances.pick([0.95, 0.96, 0.97]),
  });
  const gelcoat = round(area * 0.42);
  book.addLine(partNumber, moulding.colour === "orange" ? "GC-211" : "GC-210", gelcoat, { scrap: 0.06 });
  book.addLine(partNumber, `${partNumber}-P`, 1);
  const resin = addPlies(book, moulding);
  if (moulding.core !== "-") addCore(book, moulding);
  book.addLine(partNumber, "RS-110", round(resin), { scrap: 0.05 });
  book.addLine(partNumber, "RS-120", round((resin + gelcoat) * 0.02), { scrap: 0.05 });
  if (area > 0.5) {
    book.addLine(partNumber, "GF-9010", round(area * 1.05), { scrap: 0.08 });
    book.addLine(partNumber, "GF-9020", round(area * 0.7), { scrap: 0.08 });
    book.addLine(partNumber, "GF-9030", round(area * 1.3), { scrap: 0.08 });
    book.addLine(partNumber, "GF-9040", round(Math.sqrt(area) * 4.6), { scrap: 0.03 });
  }
  book.addLine(partNumber, "RS-910", null);
  book.addLine(partNumber, "RS-920", null);
}

function addPlies(book: Book, { partNumber, name, area, cloths }: Moulding): number {
  const pack = `${partNumber}-P`;
  book.add({
    partNumber: pack,
    description: `Ply pack, ${lowerFirst(name)}`,
    sourcing: "make",
    leadTimeDays: 1,
  });
  const seen = new Map<string, number>();
  let resin = 0;
  for (const [index, code] of cloths.entries()) {
    const cloth = CLOTHS[code];
    const nth = seen.get(code) ?? 0;
    seen.set(code, nth + 1);
    const place =
      area < 0.6 || nth === 0
        ? PLACES[index < 2 ? 0 : index === cloths.length - 1 ? 1 : 0]
        : PLACES[2 + ((index + partNumber.length) % 5)];
    const square = round(area * SHARES[place] * 1.06);
    const ply = `${pack}${String(index + 1).padStart(2, "0")}`;
    book.add({
      partNumber: ply,
      description: `Ply ${index + 1}, ${lowerFirst(name)}, ${cloth.name}, ${place}, cut`,
      sourcing: "make",
      leadTimeDays: 1,
    });
    book.addLine(pack, ply, 1);
    book.addLine(ply, cloth.partNumber, square, { scrap: 0.1 });
    resin += (square * cloth.grams * cloth.glassToResin) / 1000;
  }
  return resin;
}

function addCore(book: Book, moulding: Moulding): void {
  const { partNumber, core } = moulding;
  const [thickness, total] = core.split(":").map(Number);
  const pieces = total > 2 ? 4 : total > 0.7 ? 2 : 1;
  for (let index = 0; index < pieces; index++) {
    const piece = `${partNumber}-C${index + 1}`;
    const name = pieces === 1 ? "Core" : `Core ${index + 1} of ${pieces}`;
    book.add({
      partNumber: piece,
      description: `${name}, ${lowerFirst(moulding.name)}, ${thickness} mm, cut`,
      sourcing: "make",
      leadTimeDays: 1,
    });
    book.addLine(partNumber, piece, 1);
    book.addLine(piece, `FM-20${thickness}`, round((total / pieces) * (0.92 + 0.05 * index)), {
      scrap: 0.12,
    });
  }
}

const lowerFirst = (text: string) => text[0].toLowerCase() + text.slice(1);
const round = (value: number) => Number(value.toFixed(3));
