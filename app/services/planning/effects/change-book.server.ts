import { compileSupplies } from "~/domain/planning/compile-supplies";
import type { BookChange } from "~/schemas/planning/effects";
import { nextKitOrderNumber } from "~/services/kit-orders/next-kit-order-number.server";
import type { PlanBook } from "../get-plan-book.server";
import { layOutStock } from "../lay-out-stock";
import type { LineBook } from "../ship-line/plan-kit-orders";
import { changeBookStructure } from "../what-if/change-book-structure";
import { changeKitOrders } from "./change-kit-orders";
import { changeOpenOrders } from "./change-open-orders";
import { changeShelves } from "./change-shelves";
import { checkOrderedKits } from "./check-ordered-kits";
import { readLots } from "./read-lots.server";

/**
 * The book as it would be after the act. Only what the change touches is made again; the book itself stays as
 * it is. Throws 422 naming what cannot be done.
 */
export async function changeBook(book: PlanBook, change: BookChange): Promise<LineBook> {
  const structure = changeBookStructure(book, change, "change");
  checkOrderedKits({ ...book, structure }, change.kitOrders);
  return {
    structure,
    supplies: await changeSupplies({ ...book, structure }, change, structure !== book.structure),
    kitOrders: changeKitOrders(book.kitOrders, change.kitOrders, await nextNumberFor(change)),
    day: book.day,
  };
}

async function changeSupplies(book: PlanBook, change: BookChange, isRebuilt: boolean) {
  const { structure, rows, day } = book;
  const { add, move, remove } = change.supply;
  const hasStock = change.stock.length + change.hold.length + change.release.length > 0;
  const hasOrders = add.length + move.length + remove.length > 0;
  if (!isRebuilt && !hasStock && !hasOrders) return book.supplies;
  const usable = changeShelves(structure, rows.shelves.usable, change, await readLots(change));
  const stock = hasStock ? layOutStock({ ...rows.shelves, usable }) : rows.stock;
  return compileSupplies(structure, stock, changeOpenOrders(structure, rows.orders, change.supply), day);
}

async function nextNumberFor({ kitOrders }: BookChange): Promise<string> {
  return kitOrders.add.some(({ number }) => number === null) ? nextKitOrderNumber() : "";
}
