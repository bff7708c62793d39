import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { WhyAnswer } from "~/schemas/planning/why";
import { formatDate } from "~/utils/format/format-date";
import { whyAsked } from "./why-path";
import { WhyRow, WhyRows } from "./why-rows";

const WORDS = {
  build: "built once all its parts are there",
  buy: "to be ordered",
  "on-order": "on order",
  stock: "from stock",
} as const;

/** The day on which all of it is ready, and the parts that set it. Always counted with every open order. */
export function WhyDate({ why, via }: { why: WhyAnswer; via: string[] }) {
  const date = (day: string) => formatDate(day, { today: why.today, short: true });
  if (why.chain.length === 0) return null;
  return (
    <WhyRows
      title={`Ready ${why.readyOn <= why.today ? "today" : `on ${formatDate(why.readyOn, { today: why.today })}`}, since`}
    >
      {why.chain.map((link, place) => (
        <WhyRow key={link.partNumber} figure={<time dateTime={link.readyOn}>{date(link.readyOn)}</time>}>
          {place === 0 ? (
            <span className="figure font-semibold">{link.partNumber}</span>
          ) : (
            <Link
              to={whyAddress({ ...whyAsked(why), part: link.partNumber, via })}
              preventScrollReset
              className="figure py-1 underline"
            >
              {link.partNumber}
            </Link>
          )}{" "}
          is {WORDS[link.why]}
        </WhyRow>
      ))}
    </WhyRows>
  );
}
