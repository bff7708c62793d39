import type { CurrentPerson } from "./current-person";

/** Who sends these headers: by token where the address takes tokens, else by session cookie. */
export async function findAsker(
  _headers: Headers,
  _options: { tokens: boolean },
): Promise<CurrentPerson | null> {
  return null;
}
