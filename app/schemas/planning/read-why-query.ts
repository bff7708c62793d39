import { readCheckQuery } from "./read-check-query";

/** The parts of an address that a why is asked by, for its schema: `via` may be repeated. */
export function readWhyQuery(search: URLSearchParams): Record<string, unknown> {
  return { ...readCheckQuery(search), via: search.getAll("via") };
}
