import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { WhyAnswer } from "~/schemas/planning/why";

/** The parts walked from, each a way back. */
export function WhyPath({ why, via }: { why: WhyAnswer | null; via: readonly string[] }) {
  if (why === null || via.length === 0) return <p className="py-2 text-soft">Why this number</p>;
  return (
    <nav aria-label="Walked from" className="min-w-0">
      <ol className="flex flex-wrap gap-x-2">
        {via.map((part, place) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: the same part may be walked through twice
          <li key={place} className="flex gap-2">
            <Link
              className="figure py-2 underline"
              preventScrollReset
              to={whyAddress({ ...whyAsked(why), part, via: via.slice(0, place) })}
            >
              {part}
            </Link>
            <span aria-hidden="true" className="py-2 text-soft">
              ›
            </span>
          </li>
        ))}
        <li className="figure py-2 font-semibold">{why.part.partNumber}</li>
      </ol>
    </nav>
  );
}

/** What the next step of a walk is asked by: the same kits, counted the same way. */
export function whyAsked({ question, through, kits, with: lane }: WhyAnswer) {
  const rung = through === null && kits !== question.quantity ? { kits } : {};
  return { question: through === null ? question : null, through, with: lane, ...rung };
}
