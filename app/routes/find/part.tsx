import { FindPlaces } from "~/components/find/find-places";
import { PartPage } from "~/components/find/part/part-page";
import { getPartPage } from "~/services/find/get-part-page.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/part";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.partNumber} · Cotterpin` }];

export const loader = guardedLoader("look", ({ params }: Route.LoaderArgs, person) =>
  getPartPage(params.partNumber, person),
);

export default function Part({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <PartPage page={loaderData} />
    </>
  );
}
