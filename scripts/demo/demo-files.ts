import type { Book, BookPart } from "./book";
import { fillShelves, type StockRow } from "./fill-shelves";
import { kitOrders } from "./kit-orders";
import { layOutBins } from "./lay-out-bins";
import { openOrders } from "./open-orders";
import { packOf } from "./pack-of";
import { type PastMovement, recallMovements } from "./recall-movements";
import { makeOffers, readSuppliers, type Supplier } from "./trade-suppliers";
import { writeBook } from "./write-book";

type Cell = string | number;

/** The demo firm's CSV files by name; the same at each call. */
export function demoFiles(): Map<string, string> {
  const book = writeBook();
  const suppliers = readSuppliers();
  const stock = fillShelves(book);
  return new Map([
    ["parts.csv", partsFile(book)],
    ["structure.csv", structureFile(book)],
    ["suppliers.csv", suppliersFile(suppliers)],
    ["offers.csv", offersFile(book, suppliers)],
    [
      "bins.csv",
      file(
        ["bin", "zone", "walk_order", "description"],
        layOutBins().map((bin) => [bin.code, bin.zone, bin.walkOrder, bin.description]),
      ),
    ],
    ["stock.csv", stockFile(book, stock)],
    ["supply.csv", supplyFile(book, suppliers)],
    ["kit-orders.csv", kitOrdersFile()],
    ["movements.csv", movementsFile(book, recallMovements(book, stock, suppliers))],
  ]);
}

function partsFile(book: Book): string {
  const header = [
    "part_number",
    "description",
    "sourcing",
    "unit",
    "decimals",
    "lead_time_days",
    "safety_stock",
    "lot_rule",
    "lot_minimum",
    "lot_multiple",
    "lot_maximum",
    "lot_days",
    "yield",
    "unit_cost",
    "mass_kg",
    "sold",
  ];
  return file(
    header,
    [...book.parts.values()].sort((a, b) => (a.partNumber < b.partNumber ? -1 : 1)).map(partRow),
  );
}

function partRow(part: BookPart): Cell[] {
  const cheap = part.sourcing === "buy" && (part.cost ?? 0) < 1;
  const pack = packOf(part);
  const sized = part.sourcing === "buy" && pack.per > 1;
  const amount = (value: number) => value.toFixed(part.decimals);
  return [
    part.partNumber,
    part.description,
    part.sourcing,
    part.unit,
    part.decimals,
    part.leadTimeDays,
    sized && cheap ? amount(pack.per / 4) : "",
    cheap ? "fixed-period" : "lot-for-lot",
    sized ? amount(pack.per) : "",
    sized ? amount(pack.per) : "",
    "",
    cheap ? 56 : "",
    part.yield === 1 ? "" : part.yield,
    part.cost === null ? "" : money(part.cost),
    part.mass === null ? "" : kilograms(part.mass),
    part.sold ? 1 : "",
  ];
}

function structureFile(book: Book): string {
  const header = [
    "parent",
    "component",
    "quantity",
    "scrap",
    "find_number",
    "option",
    "from_serial",
    "to_serial",
    "from_date",
    "to_date",
  ];
  const found = new Map<string, number>();
  const rows = book.lines.map((line) => {
    const find = (found.get(line.parent) ?? 0) + 10;
    found.set(line.parent, find);
    const quantity = line.quantity === null ? "" : line.quantity.toFixed(book.part(line.component).decimals);
    return {
      parent: line.parent,
      cells: [
        line.parent,
        line.component,
        quantity,
        line.scrap || "",
        find,
        line.option,
        line.fromSerial,
        line.toSerial,
        line.fromDate,
        line.toDate,
      ],
    };
  });
  rows.sort((a, b) => (a.parent < b.parent ? -1 : a.parent > b.parent ? 1 : 0));
  return file(
    header,
    rows.map(({ cells }) => cells),
  );
}

function suppliersFile(suppliers: readonly Supplier[]): string {
  const rows = suppliers.map(({ code, name, phone, currency, leadTimeDays, note }) => [
    code,
    name,
    `orders@${code.toLowerCase()}.example`,
    phone,
    currency,
    leadTimeDays,
    note,
  ]);
  return file(["supplier", "name", "email", "phone", "currency", "lead_time_days", "note"], rows);
}

function offersFile(book: Book, suppliers: readonly Supplier[]): string {
  const header = [
    "supplier",
    "part_number",
    "supplier_part_number",
    "buying_unit",
    "per_buying_unit",
    "minimum",
    "multiple",
    "from_quantity",
    "unit_price",
    "currency",
    "lead_time_days",
    "preferred",
  ];
  const rows = makeOffers(book, suppliers).map((offer) => [
    offer.supplier,
    offer.partNumber,
    offer.supplierPartNumber,
    offer.buyingUnit,
    offer.perBuyingUnit,
    offer.minimum,
    offer.multiple,
    offer.fromQuantity,
    offer.unitPrice,
    offer.currency,
    offer.leadTimeDays,
    offer.preferred ? 1 : 0,
  ]);
  return file(
    header,
    rows.sort((a, b) => (String(a[1]) < String(b[1]) ? -1 : String(a[1]) > String(b[1]) ? 1 : 0)),
  );
}

function stockFile(book: Book, rows: readonly StockRow[]): string {
  return file(
    ["part_number", "bin", "lot", "state", "quantity", "expires_on"],
    rows.map((row) => [
      row.partNumber,
      row.bin,
      row.lot,
      row.state,
      amount(book, row.partNumber, row.steps),
      row.expiresOn,
    ]),
  );
}

function supplyFile(book: Book, suppliers: readonly Supplier[]): string {
  return file(
    ["part_number", "quantity", "due", "reference"],
    openOrders(book, suppliers).map((order) => [
      order.partNumber,
      order.quantity.toFixed(book.part(order.partNumber).decimals),
      order.due,
      order.reference,
    ]),
  );
}

function kitOrdersFile(): string {
  return file(
    ["number", "kit", "customer", "serial", "wanted_on", "priority", "options", "note"],
    kitOrders().map((order) => [
      order.number,
      order.kit,
      order.customer,
      order.serial,
      order.wantedOn,
      order.priority,
      order.options,
      order.note,
    ]),
  );
}

function movementsFile(book: Book, movements: readonly PastMovement[]): string {
  const header = [
    "happened_at",
    "kind",
    "part_number",
    "lot",
    "from_bin",
    "from_state",
    "to_bin",
    "to_state",
    "quantity",
    "reason",
    "reference",
  ];
  return file(
    header,
    movements.map((each) => [
      each.happenedAt,
      each.kind,
      each.partNumber,
      each.lot,
      each.fromBin,
      each.fromState,
      each.toBin,
      each.toState,
      amount(book, each.partNumber, each.steps),
      each.reason,
      each.reference,
    ]),
  );
}

const kilograms = (mass: number) => (mass === 0 ? "0" : mass.toFixed(mass < 0.01 ? 4 : 3));

/** Cents, and tenths of a cent where pennies count. */
const money = (cost: number) => cost.toFixed(cost < 1 ? 3 : 2);

const amount = (book: Book, partNumber: string, steps: number) =>
  (steps / 10 ** book.part(partNumber).decimals).toFixed(book.part(partNumber).decimals);

function file(header: string[], rows: Cell[][]): string {
  return `${[header, ...rows].map((row) => row.map(cell).join(",")).join("\n")}\n`;
}

function cell(value: Cell): string {
  const text = String(value);
  return /[",\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
