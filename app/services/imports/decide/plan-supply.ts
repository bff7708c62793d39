import { partKey } from "~/domain/planning/part-key";
import type { SupplyRow } from "~/schemas/imports/supply";
import type { BookPart } from "~/services/imports/book/read-book-names.server";
import type { OpenOrder, OpenOrders } from "~/services/imports/book/read-open-orders.server";
import { checkDecimals } from "~/services/imports/files/check-decimals";
import { checkStored } from "~/services/imports/files/check-stored";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { unknownPart } from "~/services/imports/files/structure-problem";
import type { Decision } from "~/services/imports/import-job";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { missingOrderNumber } from "./missing-order-number";
import { sameValues } from "./same-values";

/** An order to make or, with an id, to change. The quantity is what is still to come. */
export interface SupplyChange {
  id: number | null;
  number: string;
  part: BookPart;
  quantity: string;
  due: string | null;
}

interface Book {
  parts: ReadonlyMap<string, BookPart>;
  orders: OpenOrders;
  columns: ReadonlySet<string>;
}

interface PlannedSupply {
  decisions: Decision[];
  changes: SupplyChange[];
}

function checkRow(row: ImportRow<SupplyRow>, part: BookPart | undefined): CsvProblem[] {
  if (part === undefined) return [unknownPart(row, "part_number")];
  const { quantity } = row.value;
  return [
    part.sourcing === "phantom"
      ? { ...row.at("part_number"), expected: "a part that is bought or made; a phantom has no orders" }
      : null,
    quantity === "0" ? { ...row.at("quantity"), expected: "a quantity above 0 that is still to come" } : null,
    checkDecimals(row, "quantity", quantity, { partNumber: part.name, decimals: part.decimals }),
    checkStored(row, "quantity", quantity),
  ].filter((problem) => problem !== null);
}

/** Finds the order of each row: the same reference and part, the first row the first of them and so on. */
class OrderFinder {
  private readonly lines = new Map<string, OpenOrder[]>();
  private readonly taken = new Set<string>();
  private readonly nameless = new Map<string, number>();

  constructor(private readonly orders: OpenOrders) {
    for (const line of orders.purchase) {
      const key = this.keyOf(line.number, line.partId);
      const group = this.lines.get(key);
      if (group) group.push(line);
      else this.lines.set(key, [line]);
    }
  }

  private keyOf(number: string, partId: number): string {
    return JSON.stringify([number, partId]);
  }

  /** A row without reference gets a number that the same row gets again. */
  private referenceOf(row: SupplyRow, part: BookPart): string {
    if (row.reference !== null) return row.reference;
    const nth = (this.nameless.get(part.key) ?? 0) + 1;
    this.nameless.set(part.key, nth);
    return missingOrderNumber(part.key, nth);
  }

  find(row: SupplyRow, part: BookPart): { number: string; order: OpenOrder | null } {
    const reference = this.referenceOf(row, part);
    if (part.sourcing === "buy") {
      const order = this.lines.get(this.keyOf(reference, part.id))?.shift() ?? null;
      return { number: reference, order };
    }
    return this.findShopOrder(reference, part);
  }

  /** A shop order makes one part: the second one under a reference is numbered REFERENCE/2. */
  private findShopOrder(reference: string, part: BookPart): { number: string; order: OpenOrder | null } {
    let free: string | null = null;
    for (let nth = 1; ; nth++) {
      const number = nth === 1 ? reference : `${reference}/${nth}`;
      const order = this.orders.shop.get(number) ?? null;
      const isTaken = this.taken.has(number);
      if (!isTaken && order?.partId === part.id) return this.take(number, order);
      if (!isTaken && order === null) free ??= number;
      if (order === null && !isTaken) return this.take(free ?? number, null);
    }
  }

  private take(number: string, order: OpenOrder | null) {
    this.taken.add(number);
    return { number, order };
  }
}

function stateProblem(row: ImportRow<SupplyRow>, state: string | undefined): CsvProblem[] {
  if (state === undefined || state === "sent" || state === "released") return [];
  return [{ ...row.at("reference"), expected: `an order that is open; this one is ${state}` }];
}

/** Compares rows with the orders of the book. */
export function planSupply(
  rows: readonly ImportRow<SupplyRow>[],
  { parts, orders, columns }: Book,
): PlannedSupply {
  const finder = new OrderFinder(orders);
  const changes: SupplyChange[] = [];
  const decisions = rows.map((row): Decision => {
    const part = parts.get(partKey(row.value.partNumber));
    const problems = checkRow(row, part);
    if (part === undefined || problems.length > 0) return { row, before: null, after: null, problems };
    const { number, order } = finder.find(row.value, part);
    const state = part.sourcing === "buy" ? orders.purchaseStates.get(number) : order?.state;
    problems.push(...stateProblem(row, state));
    const due = order !== null && !columns.has("due") ? order.due : row.value.due;
    const named = { partNumber: part.name, reference: number };
    const before = order === null ? null : { ...named, quantity: order.quantity, due: order.due };
    const after = { ...named, quantity: row.value.quantity, due };
    if (!sameValues(before, after)) {
      changes.push({ id: order?.id ?? null, number, part, quantity: row.value.quantity, due });
    }
    return { row, before, after, problems };
  });
  return { decisions, changes };
}
