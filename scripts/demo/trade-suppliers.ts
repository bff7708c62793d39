import { readFileSync } from "node:fs";
import type { Book, BookPart } from "./book";
import { packOf } from "./pack-of";
import { seededRandom } from "./random";

export interface Supplier {
  code: string;
  name: string;
  trades: string[];
  phone: string;
  currency: string;
  leadTimeDays: number;
  note: string;
}

export interface Offer {
  supplier: string;
  partNumber: string;
  supplierPartNumber: string;
  buyingUnit: string;
  /** In the part's own unit. */
  perBuyingUnit: string;
  /** These four are in buying units. */
  minimum: string;
  multiple: string;
  fromQuantity: string;
  unitPrice: string;
  currency: string;
  leadTimeDays: number;
  preferred: boolean;
}

/** Rough rates, only to make believable prices of. */
const PER_EURO: Record<string, number> = { EUR: 1, DKK: 7.46, USD: 1.09 };

export function readSuppliers(): Supplier[] {
  const text = readFileSync(new URL("./book/suppliers.txt", import.meta.url), "utf8");
  return text
    .split("\n")
    .filter(Boolean)
    .map((line) => {
      const [code, name, trades, phone, currency, lead, note] = line.split("|");
      return { code, name, trades: trades.split(" "), phone, currency, leadTimeDays: Number(lead), note };
    });
}

/** Where the part is bought first. */
export function preferredSupplier(part: BookPart, suppliers: readonly Supplier[]): Supplier {
  const able = suppliers.filter(({ trades }) => trades.includes(part.trade ?? ""));
  if (able.length === 0) throw new Error(`Nobody supplies ${part.partNumber} (${part.trade}).`);
  const chances = seededRandom(`${part.partNumber}/supplier`);
  return able.length > 1 && chances.chance(0.25) ? able[1] : able[0];
}

/** Offers for every bought part: the preferred supplier's with price breaks, and often a second source's. */
export function makeOffers(book: Book, suppliers: readonly Supplier[]): Offer[] {
  const offers: Offer[] = [];
  for (const part of book.parts.values()) {
    if (part.sourcing !== "buy") continue;
    const first = preferredSupplier(part, suppliers);
    const second = suppliers.find(
      (supplier) => supplier !== first && supplier.trades.includes(part.trade ?? ""),
    );
    offers.push(...offerFrom(part, first, 1, true));
    const chances = seededRandom(`${part.partNumber}/second`);
    if (second && chances.chance(0.35))
      offers.push(...offerFrom(part, second, 1.03 + chances.next() * 0.16, false));
  }
  return offers;
}

function offerFrom(part: BookPart, supplier: Supplier, dearer: number, preferred: boolean): Offer[] {
  const pack = packOf(part);
  const chances = seededRandom(`${part.partNumber}/${supplier.code}`);
  const price = (part.cost ?? 0) * pack.per * dearer;
  const multiple =
    pack.multiple !== 1
      ? pack.multiple
      : pack.unit === "EA" && (part.cost ?? 0) < 4
        ? chances.pick([1, 5, 10])
        : 1;
  const minimum =
    pack.unit === "EA"
      ? price < 4
        ? 20
        : price < 15
          ? chances.pick([5, 10])
          : price < 60
            ? chances.pick([1, 2, 4])
            : 1
      : multiple;
  const steps: [number, number][] = [[0, 1]];
  if (price < 70 && chances.chance(0.6)) {
    steps.push([Math.max(minimum * 3, 5), 0.93]);
    if (chances.chance(0.4)) steps.push([Math.max(minimum * 10, 20), 0.86]);
  }
  const code = supplierNumber(part, supplier);
  const lead = preferred ? part.leadTimeDays : Math.max(3, part.leadTimeDays + chances.pick([-7, -3, 7, 14]));
  return steps.map(([from, factor]) => ({
    supplier: supplier.code,
    partNumber: part.partNumber,
    supplierPartNumber: code,
    buyingUnit: pack.unit === "EA" ? part.unit : pack.unit,
    perBuyingUnit: String(pack.per),
    minimum: String(roundUp(minimum, multiple)),
    multiple: String(multiple),
    fromQuantity: String(from),
    unitPrice: (price * factor * PER_EURO[supplier.currency]).toFixed(price < 1 ? 3 : 2),
    currency: supplier.currency,
    leadTimeDays: lead,
    preferred,
  }));
}

const roundUp = (value: number, multiple: number) => Math.ceil(value / multiple) * multiple;

/** Each supplier numbers goods in a way of its own. */
function supplierNumber(part: BookPart, supplier: Supplier): string {
  const chances = seededRandom(`${part.partNumber}/${supplier.code}/number`);
  const size = /(\d[\dX.]*)/.exec(part.partNumber.slice(2))?.[1] ?? "0";
  const style = supplier.code.length % 4;
  if (style === 0) return `${supplier.code.slice(0, 2)}${chances.whole(10000, 99999)}`;
  if (style === 1) return `${chances.whole(100, 999)}.${String(chances.whole(0, 9999)).padStart(4, "0")}`;
  if (style === 2)
    return `${supplier.code[0]}${size.replace(/\D/g, "")}-${chances.whole(10, 99)}${chances.pick(["A", "B", "K", "S"])}`;
  return `${chances.whole(10, 99)}-${String(chances.whole(0, 99999)).padStart(5, "0")}`;
}
