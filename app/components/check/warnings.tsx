import type { WarningCode } from "~/domain/planning/types";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";

const MOST_NAMED = 8;

const SENTENCES: Record<WarningCode, { one: string; many: string }> = {
  "as-required-none-on-hand": {
    one: "is used as required and none is on hand. It stops no kit here; look before the work starts.",
    many: "are used as required and none is on hand. They stop no kit here; look before the work starts.",
  },
  "make-without-structure": {
    one: "is built here but has no structure yet, so it counts as a part to buy. Bring in its structure.",
    many: "are built here but have no structure yet, so they count as parts to buy. Bring in their structures.",
  },
  "overdue-supply": {
    one: "is overdue on an open order. It is counted from today plus its lead time; ask the supplier for a date.",
    many: "are overdue on open orders. They are counted from today plus their lead times; ask the suppliers for dates.",
  },
  "supply-without-date": {
    one: "is on an open order without a date. Ask the supplier for one.",
    many: "are on open orders without a date. Ask the suppliers for dates.",
  },
};

/** What the reader should know beside the answer, a sentence for each kind. */
export function Warnings({ warnings }: { warnings: NonNullable<CheckPageAnswer["answer"]>["warnings"] }) {
  if (warnings.length === 0) return null;
  const kinds = [...new Set(warnings.map((warning) => warning.code))];
  return (
    <section aria-labelledby="warnings-title" className="sheet">
      <h2 id="warnings-title" className="text-lg">
        To know beside it
      </h2>
      <ul className="mt-2 grid max-w-prose gap-3">
        {kinds.map((code) => (
          <Sentence
            key={code}
            code={code}
            partNumbers={warnings
              .filter((warning) => warning.code === code)
              .map((warning) => warning.partNumber)}
          />
        ))}
      </ul>
    </section>
  );
}

function Sentence({ code, partNumbers }: { code: WarningCode; partNumbers: string[] }) {
  const named = partNumbers.slice(0, MOST_NAMED);
  const rest = partNumbers.length - named.length;
  return (
    <li>
      {named.map((partNumber, place) => (
        <span key={partNumber}>
          {joint(place, named.length, rest)}
          <span className="figure text-[0.94em]">{partNumber}</span>
        </span>
      ))}
      {rest > 0 && ` and ${rest} more`}{" "}
      {partNumbers.length === 1 ? SENTENCES[code].one : SENTENCES[code].many}
    </li>
  );
}

function joint(place: number, count: number, rest: number): string {
  if (place === 0) return "";
  return place === count - 1 && rest === 0 ? " and " : ", ";
}
