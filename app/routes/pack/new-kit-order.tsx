import { data, redirect } from "react-router";
import { formRefusal } from "~/components/kit-orders/form-refusal";
import { draftFromForm, type KitOrderDraft } from "~/components/kit-orders/kit-order-draft";
import { KitOrderForm } from "~/components/kit-orders/kit-order-form";
import { createKitOrder } from "~/services/kit-orders/create-kit-order.server";
import { findKitOrders } from "~/services/kit-orders/find-kit-orders.server";
import { findKits } from "~/services/kit-orders/find-kits.server";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import type { Route } from "./+types/new-kit-order";

export const meta: Route.MetaFunction = () => [{ title: "Enter a kit order · Cotterpin" }];

export const loader = guardedLoader("kit-orders", async () => {
  const [kits, { open }] = await Promise.all([findKits(), findKitOrders()]);
  const draft: KitOrderDraft = {
    number: "",
    kit: kits[0]?.partNumber ?? "",
    options: [],
    serial: "",
    wantedOn: "",
    customer: "",
    priority: String(lastPlace(open.at(-1)?.priority ?? 0)),
    note: "",
  };
  return { kits, draft };
});

/** A new order goes to the end of the queue, in steps of ten that leave room between, unless somebody says otherwise. */
function lastPlace(highest: number): number {
  return Math.min(Math.floor(highest / 10) * 10 + 10, 9999);
}

export const action = guardedAction("kit-orders", async ({ request }: Route.ActionArgs, person) => {
  const draft = draftFromForm(await request.formData());
  try {
    const number = await createKitOrder(draft, person);
    return redirect(`/pack/kit-orders?done=entered&number=${encodeURIComponent(number)}`);
  } catch (error) {
    if (error instanceof AppError && error.code === "invalid")
      return data({ ...formRefusal(error), draft }, { status: 422 });
    throw error;
  }
});

export default function NewKitOrder({ loaderData, actionData }: Route.ComponentProps) {
  return (
    <>
      <h1 className="text-2xl sm:text-[2rem]">Enter a kit order</h1>
      <KitOrderForm
        kits={loaderData.kits}
        draft={actionData?.draft ?? loaderData.draft}
        errors={actionData?.errors}
        problem={actionData?.problem}
      />
    </>
  );
}
