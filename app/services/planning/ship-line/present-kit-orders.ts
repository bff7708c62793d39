import type { PlannedKitOrder } from "~/schemas/planning/effects";
import type { PlanBook } from "../get-plan-book.server";
import { planKitOrders } from "./plan-kit-orders";

const kept = new WeakMap<PlanBook, Map<number, PlannedKitOrder[]>>();

/** The first so many open kit orders of the book as it stands: planned once, kept as long as the book is. */
export function presentKitOrders(book: PlanBook, most: number): PlannedKitOrder[] {
  const answers = kept.get(book) ?? new Map<number, PlannedKitOrder[]>();
  kept.set(book, answers);
  const answer = answers.get(most) ?? planKitOrders(book, most);
  answers.set(most, answer);
  return answer;
}
