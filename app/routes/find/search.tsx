import { redirect } from "react-router";
import { FindPlaces } from "~/components/find/find-places";
import { SearchPage } from "~/components/find/search-page";
import { findQuerySchema } from "~/schemas/find/find-query";
import { searchEverything } from "~/services/find/search-everything.server";
import { guardedLoader } from "~/services/people/guard.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/search";

export const meta: Route.MetaFunction = () => [{ title: "Find · Cotterpin" }];

/** With `go`, as Enter sends it, what is called exactly so opens at once. */
export const loader = guardedLoader("look", async ({ url }: Route.LoaderArgs) => {
  const { q } = parseInput(findQuerySchema, Object.fromEntries(url.searchParams));
  const answer = await searchEverything(q);
  if (url.searchParams.has("go") && answer.exact !== null) throw redirect(answer.exact);
  return answer;
});

export default function Search({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <SearchPage answer={loaderData} />
    </>
  );
}
