import { compileSupplies } from "~/domain/planning/compile-supplies";
import { partKey } from "~/domain/planning/part-key";
import type { BookChange } from "~/schemas/planning/effects";
import { nextKitOrderNumber } from "~/services/kit-orders/next-kit-order-number.server";
import type { PlanBook } from "../get-plan-book.server";
import { layOutStock } from "../lay-out-stock";
import type { LineBook } from "../ship-line/plan-kit-orders";
import { changeBookStructure } from "./change-book-structure";
import { changeKitOrders } from "./change-kit-orders";
import { changeOpenOrders } from "./change-open-orders";
import { changeShelves } from "./change-shelves";
import { readLots } from "./read-lots.server";
import { refuseChange } from "./refuse-change";

/**
 * The book as it would be after the act. Only what the change touches is made again; the book itself stays as
 * it is. Throws 422 naming what cannot be done.
 */
export async function changeBook(book: PlanBook, change: BookChange): Promise<LineBook> {
  const structure = changeBookStructure(book, change);
  checkKits(book, change);
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

/** Only what is sold as a kit can be ordered. */
function checkKits({ structure, parts }: PlanBook, { kitOrders }: BookChange): void {
  for (const list of ["add", "change"] as const) {
    kitOrders[list].forEach(({ kit }, at) => {
      if (kit === undefined) return;
      const number = structure.numberOf.get(partKey(kit));
      if (number !== undefined && parts[number].sold && parts[number].sourcing === "make") return;
      const message = `${kit} is no kit that can be ordered. Choose one of the list.`;
      throw refuseChange(`kitOrders.${list}.${at}.kit`, kit, message);
    });
  }
}
