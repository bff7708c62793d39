import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { WhyAnswer, WhyCause, WhyDemand } from "~/schemas/planning/why";
import { formatDate } from "~/utils/format/format-date";
import { sayQuantity } from "./say-quantity";
import { whyAsked } from "./why-path";
import { WhyRow, WhyRows } from "./why-rows";

/** Everything that asks for the part: kits ordered, and lines of what is built from it. Adds up to the need. */
export function WhyAsks({ why, via }: { why: WhyAnswer; via: string[] }) {
  const total = (
    <>
      <span>needed in all</span>
      <span className="figure">{sayQuantity(why.gross, why.part)}</span>
    </>
  );
  if (why.causes.length === 0 && why.demands.length === 0) {
    return (
      <WhyRows title="What asks for it">
        <li className="py-2">
          Nothing asks for it here: what stands above it is covered, or takes none of it.
        </li>
      </WhyRows>
    );
  }
  return (
    <WhyRows title="What asks for it" sum={total}>
      {why.demands.map((demand, place) => (
        <DemandRow key={demand.kitOrder ?? place} demand={demand} why={why} />
      ))}
      {why.causes.map((cause, place) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: one parent may have several lines of the part
        <CauseRow key={place} cause={cause} why={why} via={via} />
      ))}
    </WhyRows>
  );
}

function DemandRow({ demand, why }: { demand: WhyDemand; why: WhyAnswer }) {
  const due = demand.due === null ? "" : `, wanted on ${formatDate(demand.due, { today: why.today })}`;
  return (
    <WhyRow figure={sayQuantity(demand.quantity, why.part)}>
      {demand.kitOrder === null ? (
        <>The question itself{due}</>
      ) : (
        <>
          <Link
            to={`/pack/kit-orders/${encodeURIComponent(demand.kitOrder)}`}
            className="figure py-1 underline"
          >
            {demand.kitOrder}
          </Link>{" "}
          {demand.customer ?? "no customer yet"}
          {due}
        </>
      )}
    </WhyRow>
  );
}

function CauseRow({ cause, why, via }: { cause: WhyCause; why: WhyAnswer; via: string[] }) {
  const { parent } = cause;
  const scrap = Number(cause.scrap) > 0 ? `, ${percent(cause.scrap)} of it scrapped` : "";
  return (
    <WhyRow figure={sayQuantity(cause.need, why.part)}>
      <Link
        to={whyAddress({ ...whyAsked(why), part: parent.partNumber, via })}
        preventScrollReset
        className="figure py-1 font-semibold underline"
      >
        {parent.partNumber}
      </Link>{" "}
      {parent.description}
      <span className="block text-[0.9375rem] text-soft">
        <span className="figure">{sayQuantity(cause.through, parent)}</span>{" "}
        {parent.sourcing === "phantom" ? "passed through" : "to build"}, each takes{" "}
        <span className="figure">{sayQuantity(cause.quantity, why.part)}</span>
        {scrap}
        {cause.option !== null && `, with option ${cause.option}`}
        {cause.isRounded && ", rounded up"}
      </span>
    </WhyRow>
  );
}

/** `0.02` to `2 %`, digit by digit. */
function percent(fraction: string): string {
  const [whole, rest = ""] = fraction.split(".");
  const digits = rest.padEnd(2, "0");
  const full = `${whole}${digits.slice(0, 2)}`.replace(/^0+(?=\d)/, "");
  const part = digits.slice(2).replace(/0+$/, "");
  return `${full}${part === "" ? "" : `.${part}`} %`;
}
