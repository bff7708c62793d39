import { FindPlaces } from "~/components/find/find-places";
import { ShopOrderPage } from "~/components/find/places/shop-order-page";
import { getShopOrderPage } from "~/services/find/get-shop-order-page.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/shop-order";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.number} · Cotterpin` }];

export const loader = guardedLoader("look", ({ params }: Route.LoaderArgs) =>
  getShopOrderPage(params.number),
);

export default function ShopOrder({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <ShopOrderPage order={loaderData} />
    </>
  );
}
