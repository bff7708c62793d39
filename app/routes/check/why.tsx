import { WhyPanel } from "~/components/why/why-panel";
import { readWhyQuery } from "~/schemas/planning/read-why-query";
import { whyQuerySchema } from "~/schemas/planning/why";
import { guardedLoader } from "~/services/people/guard.server";
import { getWhy } from "~/services/planning/why/get-why.server";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/why";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `Why ${loaderData?.why?.part.partNumber ?? ""} · Cotterpin` },
];

/** Where the address asks what cannot be, the panel says so and Check stays as it is. */
export const loader = guardedLoader("look", async ({ url }: Route.LoaderArgs, person) => {
  try {
    const query = parseInput(whyQuerySchema, readWhyQuery(url.searchParams));
    return { why: await getWhy(query, person), via: query.via, problem: null };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return { why: null, via: [], problem: error.message };
  }
});

export default function Why({ loaderData }: Route.ComponentProps) {
  return <WhyPanel {...loaderData} />;
}
