import type { Book, BookLine } from "./book";
import { linesByParent } from "./lines-by-parent";
import { sortPartNumbers } from "./sort-part-numbers";

const today = "2026-12-01";

/** Amounts by part number, in whole steps of each part. */
export type Amounts = ReadonlyMap<string, number>;

export interface Wanted {
  kit: string;
  quantity: number;
  options?: readonly string[];
  serial?: string;
}

/** What the demands take of each part in all, when the shelves hold `stock`: a quick netting, for tuning the firm's stock. */
export function netNeed(book: Book, wanted: readonly Wanted[], stock: Amounts): Map<string, number> {
  const lines = linesByParent(book);
  const gross = new Map<string, number>();
  const add = (part: string, steps: number) => gross.set(part, (gross.get(part) ?? 0) + steps);
  for (const demand of wanted) {
    for (const [line, quantity] of applying(lines, demand.kit, demand.quantity, demand))
      add(line.component, need(book, line, quantity));
  }
  for (const partNumber of sortPartNumbers(book)) {
    const part = book.part(partNumber);
    if (part.sourcing === "buy" || part.sold) continue;
    const net = (gross.get(partNumber) ?? 0) - (stock.get(partNumber) ?? 0);
    if (net <= 0) continue;
    const started = Math.ceil(Number((net / part.yield).toFixed(6)));
    for (const line of lines.get(partNumber) ?? []) {
      if (line.quantity !== null && line.option === "") add(line.component, need(book, line, started));
    }
  }
  return gross;
}

/** Kit lines of one demand; a phantom with conditional lines is looked through here. */
function* applying(
  lines: Map<string, BookLine[]>,
  parent: string,
  quantity: number,
  demand: Wanted,
): Generator<[BookLine, number]> {
  for (const line of lines.get(parent) ?? []) {
    if (line.quantity === null || !applies(line, demand)) continue;
    if (line.component === "OP-100") yield* applying(lines, line.component, quantity, demand);
    else yield [line, quantity];
  }
}

function applies(line: BookLine, demand: Wanted): boolean {
  if (line.option !== "" && !demand.options?.includes(line.option)) return false;
  if (line.fromDate > today || (line.toDate !== "" && line.toDate < today)) return false;
  if (demand.serial === undefined) return line.toSerial === "";
  return !(line.fromSerial > demand.serial) && !(line.toSerial !== "" && line.toSerial < demand.serial);
}

function need(book: Book, line: BookLine, parents: number): number {
  const steps = Math.round((line.quantity ?? 0) * 10 ** book.part(line.component).decimals);
  return Math.ceil(Number(((steps * parents) / (1 - line.scrap)).toFixed(6)));
}
