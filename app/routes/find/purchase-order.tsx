import { FindPlaces } from "~/components/find/find-places";
import { PurchaseOrderPage } from "~/components/find/places/purchase-order-page";
import { getPurchaseOrderPage } from "~/services/find/get-purchase-order-page.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/purchase-order";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.number} · Cotterpin` }];

export const loader = guardedLoader("look", ({ params }: Route.LoaderArgs, person) =>
  getPurchaseOrderPage(params.number, person),
);

export default function PurchaseOrder({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <PurchaseOrderPage order={loaderData} />
    </>
  );
}
