/** The parts of an address that a why is asked by, for its schema: `via` and `options` may be repeated. */
export function readWhyQuery(search: URLSearchParams): Record<string, unknown> {
  return {
    ...Object.fromEntries(search),
    options: search.getAll("options").join(","),
    via: search.getAll("via"),
    ifs: search.getAll("if"),
  };
}
