import { Link } from "react-router";
import { KitOrderList } from "~/components/kit-orders/kit-order-list";
import { Saved } from "~/components/ui/saved";
import { findKitOrders } from "~/services/kit-orders/find-kit-orders.server";
import { findKits } from "~/services/kit-orders/find-kits.server";
import { guardedLoader } from "~/services/people/guard.server";
import { mayDo } from "~/services/people/permissions";
import { currentDay } from "~/utils/format/current-day";
import type { Route } from "./+types/kit-orders";

export const meta: Route.MetaFunction = () => [{ title: "Kit orders · Cotterpin" }];

const DONE: Record<string, string> = {
  entered: "is entered and counts in the ship line.",
  changed: "is changed.",
  cancelled: "is cancelled and no longer counts in the ship line.",
};

export const loader = guardedLoader("look", async ({ url }: Route.LoaderArgs, person) => {
  const [orders, kits] = await Promise.all([findKitOrders(), findKits()]);
  return {
    ...orders,
    hasKits: kits.length > 0,
    mayEdit: mayDo(person.roles, "kit-orders"),
    today: currentDay(),
    done: url.searchParams.get("done"),
    number: url.searchParams.get("number"),
  };
});

export default function KitOrders({ loaderData }: Route.ComponentProps) {
  const { open, closed, hasKits, mayEdit, today, done, number } = loaderData;
  const said = done === null ? undefined : DONE[done];
  return (
    <>
      {said && number && (
        <Saved>
          <span>
            <span className="figure">{number}</span> {said}
          </span>
        </Saved>
      )}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div>
          <h1 className="text-2xl sm:text-[2rem]">Kit orders</h1>
          <p className="mt-1 max-w-prose text-soft">
            One order is one kit. They are served from the top: priority, then wanted date, then number.
          </p>
        </div>
        {mayEdit && hasKits && (
          <Link to="/pack/kit-orders/new" className="button button-main min-h-12">
            Enter a kit order
          </Link>
        )}
      </div>
      <div className="mt-6 grid gap-4">
        {open.length > 0 ? (
          <KitOrderList title="Open" orders={open} isEditable={mayEdit} today={today} />
        ) : (
          <p className="max-w-prose py-4 text-lg">{emptyWords(hasKits, mayEdit)}</p>
        )}
        {closed.length > 0 && (
          <KitOrderList title="Closed" orders={closed} isEditable={false} today={today} />
        )}
      </div>
    </>
  );
}

function emptyWords(hasKits: boolean, mayEdit: boolean): string {
  if (!hasKits)
    return "There is no kit in the book to order yet. Bring in the parts and the structure first.";
  if (!mayEdit) return "No kit order is open. A planner or the manager can enter one.";
  return "No kit order is open. Enter the first, and the ship line at the foot says whether it can go.";
}
