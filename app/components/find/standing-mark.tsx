import type { Standing } from "~/schemas/parts/part-answer";

const WORDS: Record<Standing, string> = {
  usable: "usable",
  held: "held",
  expired: "expired",
  staged: "staged for an order",
  "with-supplier": "with a supplier",
};

/** A mark for each, told apart by its shape: a barred ring is out of use. */
const SHAPES: Record<Standing, string> = {
  usable: "M3 7.5l3 3 5-6.5",
  held: "M7 1.5a5.5 5.5 0 1 1 0 11a5.5 5.5 0 0 1 0-11M3.2 3.2l7.6 7.6",
  expired: "M2.5 1.5h9M2.5 12.5h9M3.5 1.5l7 11M10.5 1.5l-7 11",
  staged: "M2 5l5-3 5 3v5l-5 3-5-3zM2 5l5 3 5-3",
  "with-supplier": "M1.5 7h10M8 3.5L11.5 7 8 10.5",
};

/** How a balance stands, in a word and a shape. */
export function StandingMark({ standing }: { standing: Standing }) {
  const isOut = standing === "held" || standing === "expired";
  return (
    <span className={`inline-flex items-center gap-1.5 ${isOut ? "font-bold" : ""}`}>
      <svg viewBox="0 0 14 14" aria-hidden="true" className="size-3.5 shrink-0" fill="none">
        <path d={SHAPES[standing]} stroke="currentColor" strokeWidth="1.6" strokeLinejoin="round" />
      </svg>
      {WORDS[standing]}
    </span>
  );
}
