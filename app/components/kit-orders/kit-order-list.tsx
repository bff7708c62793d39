import { Link } from "react-router";
import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";
import { formatDate } from "~/utils/format/format-date";

interface KitOrderListProps {
  title: string;
  orders: PresentedKitOrder[];
  /** The order numbers lead to the form. */
  isEditable: boolean;
  today: string;
}

const STATES = { open: "open", shipped: "shipped", cancelled: "cancelled" } as const;

/** Kit orders, first served first. On a narrow page each becomes a small block. */
export function KitOrderList({ title, orders, isEditable, today }: KitOrderListProps) {
  return (
    <section className="sheet" aria-label={title}>
      <table className="w-full max-md:block">
        <caption className="pb-2 text-left text-lg font-bold max-md:block">{title}</caption>
        <thead className="max-md:sr-only">
          <tr className="border-ink border-b-2 text-left text-[0.9375rem]">
            {["Order", "Kit", "Customer", "Serial", "Wanted on", "Priority"].map((head) => (
              <th
                key={head}
                scope="col"
                className={`py-2 pr-4 font-normal last:pr-0 ${head === "Priority" ? "text-right" : ""}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="max-md:block">
          {orders.map((order) => (
            <KitOrderLine key={order.number} order={order} isEditable={isEditable} today={today} />
          ))}
        </tbody>
      </table>
    </section>
  );
}

function KitOrderLine({
  order,
  isEditable,
  today,
}: {
  order: PresentedKitOrder;
  isEditable: boolean;
  today: string;
}) {
  return (
    <tr className="border-line border-b align-top max-md:grid max-md:grid-cols-2 max-md:gap-x-4 max-md:gap-y-2 max-md:py-4">
      <th scope="row" className="figure whitespace-nowrap text-left font-semibold md:py-3 md:pr-4">
        {isEditable ? (
          <Link
            to={`/pack/kit-orders/${encodeURIComponent(order.number)}`}
            className="-my-2 inline-block py-2 underline"
          >
            {order.number}
          </Link>
        ) : (
          order.number
        )}
        {order.state !== "open" && (
          <span className="block font-normal font-sans text-soft">{STATES[order.state]}</span>
        )}
      </th>
      <td className="md:py-3 md:pr-4">
        <span className="figure font-semibold">{[order.kit, ...order.options].join(" + ")}</span>
        <span className="block text-[0.9375rem] text-soft">{order.kitDescription}</span>
      </td>
      <td className="max-md:col-span-2 md:py-3 md:pr-4">
        {order.customer || <span className="text-soft">no customer yet</span>}
        {order.note && <span className="block max-w-prose text-[0.9375rem] text-soft">{order.note}</span>}
      </td>
      <Cell label="Serial" value={order.serial} empty="not fixed" />
      <Cell
        label="Wanted on"
        value={order.wantedOn && formatDate(order.wantedOn, { today })}
        empty="any date"
      />
      <td className="figure md:py-3 md:text-right">
        <Label text="Priority" />
        {order.priority}
      </td>
    </tr>
  );
}

function Cell({ label, value, empty }: { label: string; value: string | null; empty: string }) {
  return (
    <td className="whitespace-nowrap md:py-3 md:pr-4">
      <Label text={label} />
      {value === null ? <span className="text-soft">{empty}</span> : <span className="figure">{value}</span>}
    </td>
  );
}

/** The column's name where the table has come apart; readers hear it from the header. */
function Label({ text }: { text: string }) {
  return (
    <span aria-hidden="true" className="block font-sans text-[0.9375rem] text-soft md:hidden">
      {text}
    </span>
  );
}
