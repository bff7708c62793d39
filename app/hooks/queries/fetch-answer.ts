/**
 * JSON from a route of ours; with a body it is posted. A refusal becomes an error whose message is a sentence
 * for the person.
 */
export async function fetchAnswer<Answer>(
  address: string,
  signal: AbortSignal,
  body?: unknown,
): Promise<Answer> {
  const headers: Record<string, string> = { Accept: "application/json" };
  if (body !== undefined) headers["Content-Type"] = "application/json";
  const posted = body === undefined ? {} : { method: "POST", body: JSON.stringify(body) };
  const response = await fetch(address, { signal, headers, ...posted });
  if (response.ok) return response.json() as Promise<Answer>;
  const problem = (await response.json().catch(() => null)) as { detail?: unknown } | null;
  if (typeof problem?.detail === "string") throw new Error(problem.detail);
  if (response.status === 401) throw new Error("You are signed out. Load the page again to sign in.");
  throw new Error("The server did not answer. Try again in a moment.");
}
