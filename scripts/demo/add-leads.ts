import type { Book } from "./book";
import { seededRandom } from "./random";

const COLOURS: Record<string, string> = {
  B: "black",
  R: "red",
  G: "green",
  U: "blue",
  Y: "yellow",
  W: "white",
  O: "orange",
  P: "purple",
  N: "brown",
  S: "slate",
  K: "pink",
};

/** Terminals by the largest wire that they take, mm2. */
const TERMINALS: { upTo: number; ends: [string, string, number][] }[] = [
  {
    upTo: 1,
    ends: [
      ["TM-1010", "Terminal, receptacle, 2.8 mm, tinned", 0.07],
      ["TM-1011", "Contact, socket, 0.5-1 mm2", 0.11],
      ["TM-1012", "Contact, pin, 0.5-1 mm2", 0.11],
      ["TM-1013", "Terminal, ring, M4, red", 0.08],
      ["TM-1014", "Terminal, gauge, spade, red", 0.09],
    ],
  },
  {
    upTo: 2.5,
    ends: [
      ["TM-1020", "Terminal, receptacle, 6.3 mm, tinned", 0.08],
      ["TM-1021", "Contact, socket, 1.5-2.5 mm2", 0.13],
      ["TM-1022", "Contact, pin, 1.5-2.5 mm2", 0.13],
      ["TM-1023", "Terminal, ring, M5, blue", 0.09],
      ["TM-1024", "Terminal, ring, M6, blue", 0.1],
      ["TM-1025", "Splice, butt, heat-shrink, blue", 0.24],
    ],
  },
  {
    upTo: 6,
    ends: [
      ["TM-1030", "Terminal, receptacle, 9.5 mm", 0.21],
      ["TM-1031", "Terminal, ring, M6, yellow", 0.16],
      ["TM-1032", "Terminal, ring, M8, yellow", 0.18],
      ["TM-1033", "Splice, butt, heat-shrink, yellow", 0.34],
    ],
  },
  {
    upTo: 50,
    ends: [
      ["TM-1040", "Lug, copper, 16 mm2, M8", 0.62],
      ["TM-1041", "Lug, copper, 25 mm2, M8", 0.84],
      ["TM-1042", "Lug, copper, 25 mm2, M10", 0.92],
    ],
  },
];
const SLEEVES: { upTo: number; partNumber: string; name: string; cost: number }[] = [
  { upTo: 1, partNumber: "HS-0320", name: "Sleeve, heat-shrink, 3.2 mm, black", cost: 0.28 },
  { upTo: 2.5, partNumber: "HS-0480", name: "Sleeve, heat-shrink, 4.8 mm, black", cost: 0.34 },
  { upTo: 6, partNumber: "HS-0640", name: "Sleeve, heat-shrink, 6.4 mm, glued, black", cost: 0.78 },
  { upTo: 50, partNumber: "HS-1200", name: "Sleeve, heat-shrink, 12 mm, glued, red", cost: 1.45 },
];

/** Leads of the harnesses, each cut from wire by size and colour. A harness number stands alone on its line, its leads follow: `from > to ; mm2 colour ; mm`. */
export function addLeads(book: Book, text: string): void {
  let harness = "";
  let count = 0;
  for (const line of text.split("\n").filter(Boolean)) {
    if (!line.includes(">")) {
      harness = line.trim();
      count = 0;
      continue;
    }
    count += 1;
    const [ends, wire, length] = line.split(";").map((piece) => piece.trim());
    addLead(book, {
      number: `WL-${harness.slice(3)}${String(count).padStart(2, "0")}`,
      harness,
      ends: ends.replace(" > ", " to "),
      wire,
      millimetres: Number(length),
    });
  }
}

interface Lead {
  number: string;
  harness: string;
  ends: string;
  wire: string;
  millimetres: number;
}

function addLead(book: Book, lead: Lead): void {
  const [sizeText, colour] = lead.wire.split(" ");
  const size = Number(sizeText);
  const chances = seededRandom(lead.number);
  const colourName = colour
    .split("/")
    .map((letter) => COLOURS[letter])
    .join("/");
  book.add({
    partNumber: lead.number,
    description: `Lead, ${lead.ends}, ${sizeText} mm2 ${colourName}, ${lead.millimetres} mm`,
    sourcing: "make",
    leadTimeDays: 1,
  });
  book.addLine(lead.harness, lead.number, 1);
  book.addLine(
    lead.number,
    addWire(book, size, colour, colourName),
    Number(((lead.millimetres + 20) / 1000).toFixed(3)),
    { scrap: 0.03 },
  );
  const kinds = bySize(TERMINALS, size).ends;
  const first = chances.pick(kinds);
  const second = chances.pick(kinds);
  for (const [partNumber, description, cost] of [first, second]) {
    if (!book.parts.has(partNumber))
      book.add({
        partNumber,
        description,
        sourcing: "buy",
        trade: "term",
        leadTimeDays: 14,
        cost,
        mass: size > 6 ? 0.018 : 0.001,
      });
  }
  if (first === second) book.addLine(lead.number, first[0], 2);
  else for (const end of [first, second]) book.addLine(lead.number, end[0], 1);
  const sleeve = bySize(SLEEVES, size);
  if (!book.parts.has(sleeve.partNumber))
    book.add({
      partNumber: sleeve.partNumber,
      description: sleeve.name,
      sourcing: "buy",
      trade: "term",
      unit: "MTR",
      decimals: 3,
      leadTimeDays: 14,
      cost: sleeve.cost,
      mass: 0.006,
    });
  book.addLine(lead.number, sleeve.partNumber, size > 6 ? 0.09 : 0.05, { scrap: 0.02 });
  addMarker(book, lead.number);
}

function addMarker(book: Book, lead: string): void {
  if (!book.parts.has("WM-0010"))
    book.add({
      partNumber: "WM-0010",
      description: "Sleeve, marker, printable, 25 mm, yellow",
      sourcing: "buy",
      trade: "term",
      leadTimeDays: 14,
      cost: 0.06,
      mass: 0.0003,
    });
  book.addLine(lead, "WM-0010", 2);
}

function addWire(book: Book, size: number, colour: string, colourName: string): string {
  const partNumber = `WR-${String(Math.round(size * 100)).padStart(4, "0")}-${colour.replace("/", "")}`;
  if (book.parts.has(partNumber)) return partNumber;
  const kind = size > 6 ? "Cable, battery, flexible" : "Wire, thin wall";
  const mass = Number((size * 0.0092 + 0.0035).toFixed(4));
  const cost = Number((size * 0.11 + 0.09 + (colour.includes("/") ? 0.03 : 0)).toFixed(3));
  book.add({
    partNumber,
    description: `${kind}, ${size} mm2, ${colourName}`,
    sourcing: "buy",
    trade: "wire",
    unit: "MTR",
    decimals: 3,
    leadTimeDays: 14,
    cost,
    mass,
  });
  return partNumber;
}

function bySize<Group extends { upTo: number }>(groups: readonly Group[], size: number): Group {
  return groups.find(({ upTo }) => size <= upTo) ?? groups[groups.length - 1];
}
