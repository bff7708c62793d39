const CHUNK = 500;

/** Hands items to `work` in pieces that fit one statement, one after the other; nothing for no items. */
export async function inChunks<Item, Result>(
  items: readonly Item[],
  work: (chunk: readonly Item[]) => Promise<Result>,
): Promise<Result[]> {
  const results: Result[] = [];
  for (let start = 0; start < items.length; start += CHUNK) {
    results.push(await work(items.slice(start, start + CHUNK)));
  }
  return results;
}
