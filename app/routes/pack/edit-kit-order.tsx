import { data, Link, redirect } from "react-router";
import { formRefusal } from "~/components/kit-orders/form-refusal";
import { draftFromForm, draftOf } from "~/components/kit-orders/kit-order-draft";
import { KitOrderForm } from "~/components/kit-orders/kit-order-form";
import { findKits } from "~/services/kit-orders/find-kits.server";
import { getKitOrder } from "~/services/kit-orders/get-kit-order.server";
import { updateKitOrder } from "~/services/kit-orders/update-kit-order.server";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import type { Route } from "./+types/edit-kit-order";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `${params.number} · Cotterpin` }];

export const loader = guardedLoader("kit-orders", async ({ params }: Route.LoaderArgs) => {
  const [kits, order] = await Promise.all([findKits(), getKitOrder(params.number)]);
  return { kits, order };
});

export const action = guardedAction("kit-orders", async ({ request, params }: Route.ActionArgs, person) => {
  const form = await request.formData();
  const draft = draftFromForm(form);
  const version = Number(form.get("version"));
  try {
    await updateKitOrder(params.number, { ...draft, number: params.number, version }, person);
    return redirect(`/pack/kit-orders?done=changed&number=${encodeURIComponent(params.number)}`);
  } catch (error) {
    if (error instanceof AppError && (error.code === "invalid" || error.code === "conflict"))
      return data(
        { ...formRefusal(error), draft, version },
        { status: error.code === "invalid" ? 422 : 409 },
      );
    throw error;
  }
});

export default function EditKitOrder({ loaderData, actionData }: Route.ComponentProps) {
  const { kits, order } = loaderData;
  const path = `/pack/kit-orders/${encodeURIComponent(order.number)}`;
  return (
    <>
      <h1 className="text-2xl sm:text-[2rem]">
        Kit order <span className="figure">{order.number}</span>
      </h1>
      {order.state !== "open" ? (
        <p className="mt-4 max-w-prose">This order is {order.state}, so it can no longer be changed.</p>
      ) : (
        <>
          <KitOrderForm
            kits={kits}
            draft={actionData?.draft ?? draftOf(order)}
            version={actionData?.version ?? order.version}
            errors={actionData?.errors}
            problem={actionData?.problem}
          />
          {actionData?.problem && (
            <p className="mt-4">
              <Link to={path} reloadDocument className="py-2 underline">
                Load the order again
              </Link>
            </p>
          )}
          <p className="mt-10 max-w-3xl border-line border-t pt-4">
            <Link to={`${path}/cancel`} className="inline-block py-2 underline">
              Cancel this order …
            </Link>
          </p>
        </>
      )}
    </>
  );
}
