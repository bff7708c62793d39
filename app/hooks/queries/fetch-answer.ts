/** JSON from a route of ours; a refusal becomes an error whose message is a sentence for the person. */
export async function fetchAnswer<Answer>(address: string, signal: AbortSignal): Promise<Answer> {
  const response = await fetch(address, { signal, headers: { Accept: "application/json" } });
  if (response.ok) return response.json() as Promise<Answer>;
  const problem = (await response.json().catch(() => null)) as { detail?: unknown } | null;
  if (typeof problem?.detail === "string") throw new Error(problem.detail);
  if (response.status === 401) throw new Error("You are signed out. Load the page again to sign in.");
  throw new Error("The server did not answer. Try again in a moment.");
}
