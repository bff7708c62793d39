import { Link } from "react-router";
import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";
import { DueWords } from "../due-words";
import { FactList } from "../fact-list";
import { PartLink } from "../part-link";
import { PageHead } from "./page-head";

const STATES: Record<PresentedKitOrder["state"], string> = {
  open: "It is open.",
  shipped: "It has shipped.",
  cancelled: "It is cancelled.",
};

interface KitOrderPageProps {
  order: PresentedKitOrder;
  mayEdit: boolean;
  today: string;
}

/** A kit order to read; who may change it finds the way to its form. */
export function KitOrderPage({ order, mayEdit, today }: KitOrderPageProps) {
  const isOpen = order.state === "open";
  return (
    <>
      <PageHead name={order.number}>
        <p>
          Kit order{order.customer && ` of ${order.customer}`}. {STATES[order.state]}
        </p>
        {order.note && <p className="text-base text-soft">{order.note}</p>}
      </PageHead>
      <section aria-labelledby="wanted-title" className="sheet max-w-2xl">
        <h2 id="wanted-title" className="text-lg">
          What is wanted
        </h2>
        <FactList
          facts={[
            { name: "Kit", value: <PartLink partNumber={order.kit} description={order.kitDescription} /> },
            { name: "Options", value: order.options.length > 0 ? order.options.join(", ") : "none" },
            { name: "Serial", value: <span className="figure">{order.serial ?? "not fixed"}</span> },
            { name: "Wanted on", value: <DueWords due={order.wantedOn} today={isOpen ? today : ""} /> },
            { name: "Priority", value: <span className="figure">{order.priority}</span> },
          ]}
        />
        {mayEdit && isOpen && (
          <Link to={`/pack/kit-orders/${encodeURIComponent(order.number)}`} className="button mt-4">
            Change this order
          </Link>
        )}
      </section>
    </>
  );
}
