import type { Book, BookLine } from "./book";

export function linesByParent(book: Book): Map<string, BookLine[]> {
  const lines = new Map<string, BookLine[]>();
  for (const line of book.lines) {
    const known = lines.get(line.parent);
    if (known) known.push(line);
    else lines.set(line.parent, [line]);
  }
  return lines;
}
