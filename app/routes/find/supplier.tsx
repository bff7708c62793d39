import { FindPlaces } from "~/components/find/find-places";
import { SupplierPage } from "~/components/find/places/supplier-page";
import { getSupplierPage } from "~/services/find/get-supplier-page.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/supplier";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.supplier} · Cotterpin` }];

export const loader = guardedLoader("look", ({ params }: Route.LoaderArgs, person) =>
  getSupplierPage(params.supplier, person),
);

export default function Supplier({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <SupplierPage supplier={loaderData} />
    </>
  );
}
