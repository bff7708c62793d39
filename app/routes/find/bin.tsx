import { FindPlaces } from "~/components/find/find-places";
import { BinPage } from "~/components/find/places/bin-page";
import { getBinPage } from "~/services/find/get-bin-page.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/bin";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.bin} · Cotterpin` }];

export const loader = guardedLoader("look", ({ params }: Route.LoaderArgs) => getBinPage(params.bin));

export default function Bin({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <BinPage bin={loaderData} />
    </>
  );
}
