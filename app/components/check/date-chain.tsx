import { Link } from "react-router";
import type { ChainLink } from "~/domain/planning/types";
import type { CheckPageAnswer, CheckPart } from "~/schemas/planning/check-answer";
import { daysBetween, formatDate } from "~/utils/format/format-date";
import { ChainBar } from "./chain-bar";
import { whyAddress } from "./why-address";

/** What sets the date: from the kit down to the part that everything waits for, each on one line of time. */
export function DateChain({ page }: { page: CheckPageAnswer }) {
  const chain = page.answer?.criticalChain ?? [];
  const today = page.answer?.today;
  if (today === undefined || chain.length === 0) return null;
  const whole = daysBetween(today, chain[0].readyOn);
  const parts = new Map(page.parts.map((part) => [part.partNumber, part]));
  return (
    <section aria-labelledby="chain-title" className="sheet">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id="chain-title" className="text-lg">
          What sets the date
        </h2>
        <p className="text-soft">
          {whole <= 0 ? "nothing: all is here" : `${formatDate(chain[0].readyOn, { today })}, ${days(whole)}`}
        </p>
      </div>
      {whole > 0 && (
        <ol className="mt-3 grid gap-y-2.5">
          {chain.map((link, place) => (
            <li
              key={link.partNumber}
              className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 sm:grid-cols-[minmax(0,13rem)_minmax(0,1fr)_auto]"
            >
              <LinkName
                link={link}
                part={parts.get(link.partNumber)}
                to={whyAddress({ question: page.question, part: link.partNumber, with: "orders" })}
              />
              <ChainBar
                from={daysBetween(today, chain[place + 1]?.readyOn ?? today)}
                to={daysBetween(today, link.readyOn)}
                whole={whole}
                why={link.why}
              />
              <time dateTime={link.readyOn} className="figure whitespace-nowrap text-right text-[0.9375rem]">
                {formatDate(link.readyOn, { today, short: true })}
              </time>
            </li>
          ))}
        </ol>
      )}
    </section>
  );
}

function LinkName({ link, part, to }: { link: ChainLink; part: CheckPart | undefined; to: string }) {
  return (
    <p className="min-w-0 leading-snug">
      <Link to={to} preventScrollReset className="figure block truncate underline">
        {link.partNumber}
      </Link>
      <span className="block text-[0.9375rem] text-soft">
        {part === undefined ? "" : `${part.description.split(",")[0]}, `}
        {reason(link, part)}
      </span>
    </p>
  );
}

function reason(link: ChainLink, part: CheckPart | undefined): string {
  const time = part === undefined || part.leadTimeDays === 0 ? "" : `, ${days(part.leadTimeDays)}`;
  if (link.why === "build")
    return part?.sourcing === "phantom" ? "put together with its parent" : `to build${time}`;
  if (link.why === "buy") return `to buy${time}`;
  return link.why === "on-order" ? "on order" : "on the shelf";
}

function days(count: number): string {
  return count === 1 ? "1 day" : `${count} days`;
}
