/** The parts of an address that Check is asked by, for its schema: `options` and `if` may be repeated. */
export function readCheckQuery(search: URLSearchParams): Record<string, unknown> {
  return {
    ...Object.fromEntries(search),
    options: search.getAll("options").join(","),
    ifs: search.getAll("if"),
  };
}
