import { data, Form, Link, redirect } from "react-router";
import { EffectLine } from "~/components/ui/effect-line";
import { Notice } from "~/components/ui/notice";
import { cancelKitOrder } from "~/services/kit-orders/cancel-kit-order.server";
import { getKitOrder } from "~/services/kit-orders/get-kit-order.server";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import type { Route } from "./+types/cancel-kit-order";

export const meta: Route.MetaFunction = ({ params }) => [{ title: `Cancel ${params.number} · Cotterpin` }];

export const loader = guardedLoader("kit-orders", ({ params }: Route.LoaderArgs) =>
  getKitOrder(params.number),
);

export const action = guardedAction("kit-orders", async ({ request, params }: Route.ActionArgs, person) => {
  const version = Number((await request.formData()).get("version"));
  try {
    await cancelKitOrder(params.number, version, person);
    return redirect(`/pack/kit-orders?done=cancelled&number=${encodeURIComponent(params.number)}`);
  } catch (error) {
    if (error instanceof AppError && error.code === "conflict")
      return data({ problem: error.message }, { status: 409 });
    throw error;
  }
});

export default function CancelKitOrder({ loaderData: order, actionData }: Route.ComponentProps) {
  return (
    <>
      <h1 className="text-2xl sm:text-[2rem]">
        Cancel kit order <span className="figure">{order.number}</span>?
      </h1>
      {actionData && <Notice className="mt-4">{actionData.problem}</Notice>}
      <p className="mt-4 max-w-prose">
        One <span className="figure">{[order.kit, ...order.options].join(" + ")}</span>
        {order.customer && ` for ${order.customer}`}. Its parts become free for the orders after it. A
        cancelled order stays in the list and cannot be opened again; enter a new one instead.
      </p>
      {order.state === "open" && (
        <EffectLine
          change={{ kitOrders: { cancel: [order.number] } }}
          waiting=""
          className="mt-6 max-w-3xl"
        />
      )}
      <Form method="post" className="mt-2 flex flex-wrap items-center gap-4">
        <input type="hidden" name="version" value={order.version} />
        <button type="submit" className="button button-main min-h-12">
          Cancel {order.number}
        </button>
        <Link to={`/pack/kit-orders/${encodeURIComponent(order.number)}`} className="px-2 py-3 underline">
          Keep it
        </Link>
      </Form>
    </>
  );
}
