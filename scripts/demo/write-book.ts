import { readFileSync } from "node:fs";
import { addLeads } from "./add-leads";
import { addMouldings } from "./add-mouldings";
import { addSkirts } from "./add-skirts";
import { Book } from "./book";
import { readOutline } from "./read-outline";

const OUTLINES = [
  "00-materials",
  "50-hull",
  "20-drive",
  "10-power",
  "55-electrical",
  "30-controls",
  "40-cabin",
  "60-trailing",
  "70-four-seat",
];

/** The firm's parts and structures: outlines in `book/`, with mouldings, skirts and leads worked out from their tables. */
export function writeBook(): Book {
  const book = new Book();
  const [materials, ...units] = OUTLINES.map(read);
  readOutline(book, materials);
  for (const unit of units) readOutline(book, unit);
  addMouldings(book, read("mouldings"));
  addLeads(book, read("leads"));
  addSkirts(book);
  addBagLabels(book);
  for (const line of book.lines) {
    book.part(line.parent);
    book.part(line.component);
  }
  return book;
}

/** Every hardware bag is a bag of a size with its own printed label. */
function addBagLabels(book: Book): void {
  for (const bag of [...book.parts.values()].filter((part) => part.partNumber.startsWith("HK-"))) {
    const label = `BL-${bag.partNumber.slice(3)}`;
    const large = book.lines.filter((line) => line.parent === bag.partNumber).length > 9;
    const name = bag.description.replace("Hardware bag, ", "");
    book.add({
      partNumber: label,
      description: `Label, bag ${bag.partNumber}, ${name}`,
      sourcing: "buy",
      trade: "pack",
      leadTimeDays: 7,
      cost: 0.05,
      mass: 0.001,
    });
    book.addLine(bag.partNumber, label, 1);
    book.addLine(bag.partNumber, large ? "PK-1230" : "PK-1231", 1);
  }
}

function read(name: string): string {
  return readFileSync(new URL(`./book/${name}.txt`, import.meta.url), "utf8");
}
