import type { RefObject } from "react";
import { Link } from "react-router";
import { Cautions } from "~/components/check/cautions";
import { whyAddress } from "~/components/check/why-address";
import type { WhyAnswer } from "~/schemas/planning/why";
import { formatDate } from "~/utils/format/format-date";
import { sayQuantity } from "./say-quantity";
import { WhyAsks } from "./why-asks";
import { WhyCovers } from "./why-covers";
import { WhyDate } from "./why-date";
import { whyAsked } from "./why-path";
import { WhyTakes } from "./why-takes";

interface WhyBodyProps {
  why: WhyAnswer;
  via: string[];
  title: RefObject<HTMLHeadingElement | null>;
}

const REST_WORDS = {
  missing: "missing here",
  short: "not even on order",
  built: "to be built",
  "passed on": "passed on to its parts",
} as const;

/** The number in a sentence, then what asks for it, what covers it, and what sets its date. */
export function WhyBody({ why, via, title }: WhyBodyProps) {
  const next = [...via, why.part.partNumber];
  const isStock = why.with === "stock";
  const other = whyAddress({
    ...whyAsked(why),
    with: isStock ? "orders" : "stock",
    part: why.part.partNumber,
    via,
  });
  return (
    <>
      <h2 id="why-title" ref={title} tabIndex={-1} className="mt-1 text-2xl outline-none">
        <span className="sr-only">Why </span>
        <span className="figure">{why.part.partNumber}</span>
      </h2>
      <p className="text-soft">{why.part.description}</p>
      <p className="mt-4 max-w-prose text-lg">
        For {sayKits(why)}: <Amount why={why} of={why.gross} /> needed,{" "}
        <Amount why={why} of={why.fromStock} /> from stock
        {isStock ? "" : ", "}
        {!isStock && (
          <>
            <Amount why={why} of={why.onOrder} /> from open orders
          </>
        )}
        , <Amount why={why} of={why.rest} isStop={isStop(why)} /> {REST_WORDS[why.restIs]}.
      </p>
      <p className="mt-1 text-[0.9375rem] text-soft">
        Counted with {isStock ? "what is here today" : "what is here and on order"}
        {why.question.by !== null && !isStock && ` by ${formatDate(why.question.by, { today: why.today })}`}.{" "}
        <Link to={other} preventScrollReset className="py-1 underline print:hidden">
          Count {isStock ? "open orders as well" : "what is here today alone"}
        </Link>
      </p>
      <WhyAsks why={why} via={next} />
      <WhyCovers why={why} />
      <WhyTakes why={why} via={next} />
      <WhyDate why={why} via={next} />
      <div className="mt-6">
        <Cautions />
      </div>
    </>
  );
}

function isStop({ rest, restIs }: WhyAnswer): boolean {
  return Number(rest) > 0 && (restIs === "missing" || restIs === "short");
}

function Amount({ why, of, isStop: stops = false }: { why: WhyAnswer; of: string; isStop?: boolean }) {
  return (
    <strong className={`figure font-semibold whitespace-nowrap ${stops ? "text-stop" : ""}`}>
      {sayQuantity(of, why.part)}
    </strong>
  );
}

function sayKits({ kits, question, through }: WhyAnswer): string {
  if (through !== null)
    return kits === 1 ? `kit order ${through}` : `the ${kits} open kit orders up to ${through}`;
  return `${kits} of ${[question.kit, ...question.options].join(" + ")}`;
}
