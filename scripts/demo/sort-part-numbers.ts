import type { Book } from "./book";
import { linesByParent } from "./lines-by-parent";

const cache = new WeakMap<Book, string[]>();

/** Part numbers with every parent before its components. */
export function sortPartNumbers(book: Book): string[] {
  const known = cache.get(book);
  if (known) return known;
  const lines = linesByParent(book);
  const waiting = new Map<string, number>();
  for (const line of book.lines) waiting.set(line.component, (waiting.get(line.component) ?? 0) + 1);
  const sorted = [...book.parts.keys()].filter((part) => !waiting.has(part));
  for (let index = 0; index < sorted.length; index++) {
    for (const line of lines.get(sorted[index]) ?? []) {
      const left = (waiting.get(line.component) ?? 0) - 1;
      waiting.set(line.component, left);
      if (left === 0) sorted.push(line.component);
    }
  }
  if (sorted.length !== book.parts.size) throw new Error("The book's structure has a loop.");
  cache.set(book, sorted);
  return sorted;
}
