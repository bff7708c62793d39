import { FindPlaces } from "~/components/find/find-places";
import { KitOrderPage } from "~/components/find/places/kit-order-page";
import { getKitOrder } from "~/services/kit-orders/get-kit-order.server";
import { guardedLoader } from "~/services/people/guard.server";
import { mayDo } from "~/services/people/permissions";
import { today } from "~/utils/clock";
import type { Route } from "./+types/kit-order";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.number} · Cotterpin` }];

export const loader = guardedLoader("look", async ({ params }: Route.LoaderArgs, person) => ({
  order: await getKitOrder(params.number),
  mayEdit: mayDo(person.roles, "kit-orders"),
  today: today(),
}));

export default function KitOrder({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <KitOrderPage {...loaderData} />
    </>
  );
}
