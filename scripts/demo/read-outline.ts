import type { Book, LineTerms } from "./book";
import { seededRandom } from "./random";

interface Entry {
  partNumbers: string[];
  descriptions: string[];
  quantity: string;
  part: string[] | null;
  terms: LineTerms;
}

/**
 * Reads an indented outline into the book. A line is
 * `NUMBER QUANTITY [Description] [; b COST MASS LEAD TRADE | m LEAD | p] [; line terms]`; what is indented below it is its components.
 * `{a|b}` stands for several parts alike, `NUMBER..` counts them up, `1.2~3.4` is a size chosen once for each,
 * and a line with `+` adds components already known, `NUMBER*QUANTITY`.
 */
export function readOutline(book: Book, text: string): void {
  const open: { indent: number; partNumbers: string[] }[] = [];
  for (const raw of text.split("\n")) {
    if (raw.trim() === "") continue;
    const indent = raw.length - raw.trimStart().length;
    while (open.length > 0 && open[open.length - 1].indent >= indent) open.pop();
    const parents = open.at(-1)?.partNumbers ?? [];
    if (raw.trim().startsWith("+")) {
      addKnown(book, parents, raw.trim().slice(1).trim());
      continue;
    }
    const entry = readEntry(raw.trim());
    addParts(book, entry);
    for (const [index, parent] of parents.entries()) addLines(book, parent, index, parents.length, entry);
    open.push({ indent, partNumbers: entry.partNumbers });
  }
}

function readEntry(text: string): Entry {
  const [head, ...rest] = text.split(";").map((piece) => piece.trim());
  const [number, quantity, ...words] = head.split(" ");
  const descriptions = alternatives(words.join(" "));
  let part: string[] | null = null;
  let terms: LineTerms = {};
  for (const piece of rest) {
    if (/^[bmp]\b/.test(piece)) part = piece.split(/\s+/);
    else terms = readTerms(piece);
  }
  const partNumbers = expandNumber(number, descriptions.length);
  return { partNumbers, descriptions, quantity, part, terms };
}

function expandNumber(number: string, count: number): string[] {
  const run = /^(.*-)(\d+)\.\.(\d*)$/.exec(number);
  if (!run) return alternatives(number);
  const first = Number(run[2]);
  const last = run[3] ? Number(run[3]) : first + count - 1;
  return Array.from({ length: last - first + 1 }, (_, index) => `${run[1]}${first + index}`);
}

function alternatives(text: string): string[] {
  const match = /^(.*?)\{(.*?)\}(.*)$/.exec(text);
  if (!match) return [text];
  return match[2].split("|").map((word) => match[1] + word + match[3]);
}

function readTerms(piece: string): LineTerms {
  const terms: LineTerms = {};
  for (const word of piece.split(/\s+/)) {
    const [key, value] = word.split("=");
    if (key === "s") terms.scrap = Number(value);
    else if (key === "o") terms.option = value;
    else if (key === "fs") terms.fromSerial = value;
    else if (key === "ts") terms.toSerial = value;
    else if (key === "fd") terms.fromDate = value;
    else if (key === "td") terms.toDate = value;
    else throw new Error(`"${word}" is no term of a line.`);
  }
  return terms;
}

function addParts(book: Book, entry: Entry): void {
  if (!entry.part) return;
  const [kind, ...fields] = entry.part;
  for (const [index, partNumber] of entry.partNumbers.entries()) {
    const description = entry.descriptions[index] ?? entry.descriptions[0];
    if (kind === "p") book.add({ partNumber, description, sourcing: "phantom" });
    else if (kind === "m")
      book.add({
        partNumber,
        description,
        sourcing: "make",
        leadTimeDays: Number(fields[0]),
        ...readMarks(fields.slice(1)),
      });
    else {
      const [cost, mass, lead, trade, ...marks] = fields;
      const chosen = {
        cost: choose(cost, `${partNumber}/cost`, 2),
        mass: choose(mass, `${partNumber}/mass`, 3),
      };
      book.add({
        partNumber,
        description,
        sourcing: "buy",
        leadTimeDays: Number(lead),
        trade,
        ...chosen,
        ...readMarks(marks),
      });
    }
  }
}

function readMarks(marks: string[]) {
  const read: {
    unit?: string;
    decimals?: number;
    yield?: number;
    lotted?: boolean;
    sold?: boolean;
    mass?: number;
  } = {};
  for (const mark of marks) {
    const [key, value] = mark.split("=");
    if (key === "u") {
      read.unit = value.split(".")[0];
      read.decimals = Number(value.split(".")[1]);
    } else if (key === "y") read.yield = Number(value);
    else if (key === "mass") read.mass = Number(value);
    else if (key === "lot") read.lotted = true;
    else if (key === "sold") read.sold = true;
    else throw new Error(`"${mark}" is no mark of a part.`);
  }
  return read;
}

function addLines(book: Book, parent: string, index: number, parents: number, entry: Entry): void {
  const parallel = entry.part === null && entry.partNumbers.length === parents && parents > 1;
  const components = parallel ? [entry.partNumbers[index]] : entry.partNumbers;
  for (const component of components) {
    if (entry.quantity === "AR") book.addLine(parent, component, null, entry.terms);
    else book.addLine(parent, component, choose(entry.quantity, `${parent}/${component}`, 3), entry.terms);
  }
}

function addKnown(book: Book, parents: string[], text: string): void {
  for (const parent of parents) {
    for (const word of text.split(" ")) {
      const [component, quantity] = word.split("*");
      book.addLine(parent, component, Number(quantity ?? 1));
    }
  }
}

function choose(text: string, name: string, decimals: number): number {
  const [low, high] = text.split("~").map(Number);
  if (Number.isNaN(low)) throw new Error(`"${text}" is no amount (${name}).`);
  if (high === undefined) return low;
  return Number((low + seededRandom(name).next() * (high - low)).toFixed(decimals));
}
