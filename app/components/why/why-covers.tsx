import type { WhyAnswer, WhyCover, WhyOutOfReach } from "~/schemas/planning/why";
import { formatDate } from "~/utils/format/format-date";
import { sayQuantity } from "./say-quantity";
import { WhyRow, WhyRows } from "./why-rows";

const OUT_WORDS = {
  held: "held",
  staged: "staged for an order",
  "with-supplier": "with a supplier",
  expired: "expired",
} as const;

const REST_WORDS = {
  missing: "missing here today",
  short: "short: not even on order",
  built: "net, to be built",
  "passed on": "passed on to its parts",
} as const;

/** What covers the need, row by row, and what is left of it; then what is there and does not count. */
export function WhyCovers({ why }: { why: WhyAnswer }) {
  const date = (day: string) => formatDate(day, { today: why.today });
  const say = (quantity: string) => sayQuantity(quantity, why.part);
  const sum = (
    <>
      <span>{REST_WORDS[why.restIs]}</span>
      <span className="figure">{say(why.rest)}</span>
    </>
  );
  return (
    <>
      <WhyRows title="What covers it" sum={sum}>
        {why.lots === null ? (
          <WhyRow figure={say(why.fromStock)}>usable stock</WhyRow>
        ) : (
          why.lots.map((lot) => (
            <WhyRow key={lot.name} figure={say(lot.used)}>
              {lot.name === null ? "stock without a lot" : <LotName name={lot.name} />}
              {lot.day !== null && `, usable up to ${date(lot.day)}`}
            </WhyRow>
          ))
        )}
        {why.lots?.length === 0 && <WhyRow figure={say("0")}>no usable lot</WhyRow>}
        {why.orders.map((order) => (
          <OrderRow key={`${order.name} ${order.day}`} order={order} say={say} date={date} />
        ))}
      </WhyRows>
      {why.outOfReach.length > 0 && (
        <WhyRows title="There, and not counted">
          {why.outOfReach.map((row) => (
            <WhyRow key={`${row.bin} ${row.lot} ${row.state}`} figure={say(row.quantity)}>
              <OutWords row={row} date={date} />
            </WhyRow>
          ))}
        </WhyRows>
      )}
    </>
  );
}

function LotName({ name }: { name: string }) {
  return (
    <>
      lot <span className="figure">{name}</span>
    </>
  );
}

function OrderRow({
  order,
  say,
  date,
}: {
  order: WhyCover;
  say: (quantity: string) => string;
  date: (day: string) => string;
}) {
  const when = order.day === null ? "" : date(order.day);
  return (
    <WhyRow figure={say(order.used)}>
      open order <span className="figure">{order.name ?? "without a number"}</span>
      {order.flag === null
        ? `, due ${when}`
        : `, ${order.flag === "overdue" ? "overdue" : "no date"}: counted for ${when}`}
    </WhyRow>
  );
}

function OutWords({ row, date }: { row: WhyOutOfReach; date: (day: string) => string }) {
  return (
    <>
      <strong>{OUT_WORDS[row.state]}</strong>
      {row.state === "expired" && row.expiresOn !== null && ` on ${date(row.expiresOn)}`}, in{" "}
      <span className="figure">{row.bin}</span>
      {row.lot !== "" && (
        <>
          , <LotName name={row.lot} />
        </>
      )}
    </>
  );
}
