import { isDeepStrictEqual } from "node:util";
import type { BookChange, EffectsAnswer, OwnKitOrder } from "~/schemas/planning/effects";
import { getPlanBook } from "../get-plan-book.server";
import { describeShipLine } from "../ship-line/describe-ship-line";
import { kitsShown } from "../ship-line/kits-shown.server";
import { type LineBook, planKitOrders } from "../ship-line/plan-kit-orders";
import { presentKitOrders } from "../ship-line/present-kit-orders";
import { changeBook } from "./change-book.server";

/** As far down the queue an order is planned for its own sake. */
const FURTHEST_PLACE = 60;

/**
 * What an act would do to the ship line: before it and after it, and which orders become ready or stop.
 * Changes nothing. The line before is kept with the book, and what the act does not touch is not made again.
 * @throws AppError `invalid` naming what cannot be done
 */
export async function previewEffects(change: BookChange): Promise<EffectsAnswer> {
  const [book, shown] = await Promise.all([getPlanBook(), kitsShown()]);
  const changed = await changeBook(book, change);
  const touched = placesOf(changed, touchedOrders(book, changed, change));
  const places = touched.map(({ place }) => place).filter((place) => place <= FURTHEST_PLACE);
  const most = Math.max(shown, ...places);
  const [was, planned] = [presentKitOrders(book, most), planKitOrders(changed, most)];
  const [before, after] = [was.slice(0, shown), planned.slice(0, shown)];
  const wasReady = new Map(before.map((order) => [order.kitOrder, order.isReady]));
  const own = touched.map((order): OwnKitOrder => ({ ...order, planned: planned[order.place - 1] ?? null }));
  return {
    today: book.day,
    revision: book.revision,
    before: describeShipLine(before),
    after: describeShipLine(after),
    becomeReady: after
      .filter((order) => order.isReady && wasReady.get(order.kitOrder) === false)
      .map((order) => order.kitOrder),
    stop: after.filter((order) => !order.isReady && wasReady.get(order.kitOrder) === true),
    own: own.filter(({ kitOrder, place, planned }) => {
      const isInPlace = book.kitOrders[place - 1]?.number === kitOrder;
      return !isInPlace || !isDeepStrictEqual(planned, was[place - 1] ?? null);
    }),
  };
}

/** The orders that the change enters or speaks of. */
function touchedOrders(book: LineBook, changed: LineBook, { kitOrders }: BookChange): Set<string> {
  const touched = new Set(changed.kitOrders.map(({ number }) => number));
  for (const { number } of book.kitOrders) touched.delete(number);
  for (const { number } of kitOrders.change) touched.add(number);
  return touched;
}

function placesOf({ kitOrders }: LineBook, numbers: ReadonlySet<string>) {
  return kitOrders.flatMap(({ number }, at) =>
    numbers.has(number) ? [{ kitOrder: number, place: at + 1 }] : [],
  );
}
