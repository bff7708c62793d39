import { StructurePage } from "~/components/structure/structure-page";
import { structurePlanQuerySchema } from "~/schemas/parts/structure-plan";
import { getStructurePlan } from "~/services/parts/get-structure-plan.server";
import { guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import type { Route } from "./+types/structure";

export const meta: Route.MetaFunction = ({ params }) => [
  { title: `Structure of ${params.partNumber} · Cotterpin` },
];

/** Where the address asks what cannot be, the page says so and shows one of the part. */
export const loader = guardedLoader("look", async ({ params, url }: Route.LoaderArgs) => {
  const asked = structurePlanQuerySchema.safeParse(Object.fromEntries(url.searchParams));
  const plain = { kits: 1, options: [] };
  if (!asked.success) {
    return { plan: await getStructurePlan(params.partNumber, plain), problem: asked.error.issues[0].message };
  }
  try {
    return { plan: await getStructurePlan(params.partNumber, asked.data), problem: null };
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== "invalid") throw error;
    return { plan: await getStructurePlan(params.partNumber, plain), problem: error.message };
  }
});

export default function Structure({ loaderData }: Route.ComponentProps) {
  return <StructurePage {...loaderData} />;
}
