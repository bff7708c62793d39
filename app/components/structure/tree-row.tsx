import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { StructurePlan } from "~/schemas/parts/structure-plan";
import { formatQuantity } from "~/utils/format/format-quantity";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { isMissing } from "./visible-rows";

interface TreeRowProps {
  plan: StructurePlan;
  at: number;
  /** Among the rows that are drawn. */
  place: number;
  /** Learns the height of the row, which on a small page hangs on its words. */
  measure: (row: HTMLElement | null) => void;
  isBranch: boolean;
  isOpen: boolean;
  isCurrent: boolean;
  onActive: (at: number) => void;
  onBranch: (at: number, isOpen: boolean) => void;
}

const INDENTS = ["pl-0", "pl-4", "pl-8", "pl-12", "pl-16", "pl-20", "pl-24", "pl-28", "pl-32"];

/** One place in the tree. */
export function TreeRow({
  plan,
  at,
  place,
  measure,
  isBranch,
  isOpen,
  isCurrent,
  onActive,
  onBranch,
}: TreeRowProps) {
  const row = plan.rows[at];
  const part = plan.parts[row.part];
  const stops = isMissing(part);
  const say = (quantity: string | null) => (quantity === null ? "" : formatQuantity(quantity, part.decimals));
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: the keys are handled by the tree
    <div
      role="row"
      data-row={at}
      tabIndex={isCurrent ? 0 : -1}
      aria-level={row.level}
      data-index={place}
      ref={measure}
      aria-rowindex={place + 2}
      aria-expanded={isBranch ? isOpen : undefined}
      className={`structure-row border-line border-t -outline-offset-2 ${isCurrent ? "bg-paper" : ""}`}
      onClick={() => onActive(at)}
    >
      <span
        role="gridcell"
        className={`flex min-w-0 items-center gap-1 ${INDENTS[Math.min(row.level - 1, 8)]}`}
      >
        {isBranch ? (
          <button
            type="button"
            tabIndex={-1}
            aria-label={`${isOpen ? "Close" : "Open"} ${part.partNumber}`}
            className="grid size-8 shrink-0 place-items-center"
            onClick={() => onBranch(at, !isOpen)}
          >
            <svg viewBox="0 0 10 10" aria-hidden="true" className={`size-3 ${isOpen ? "rotate-90" : ""}`}>
              <path d="M3 1l4 4-4 4" fill="none" stroke="currentColor" strokeWidth="1.8" />
            </svg>
          </button>
        ) : (
          <span className="w-8 shrink-0" />
        )}
        <Link
          tabIndex={-1}
          to={`/find/parts/${encodeURIComponent(part.partNumber)}`}
          className="figure shrink-0 font-semibold no-underline hover:underline"
        >
          {part.partNumber}
        </Link>
        <span className="min-w-0 truncate text-[0.9375rem] text-soft" title={part.description}>
          {part.description}
        </span>
        {notes(plan, at) && (
          <span className="shrink-0 text-[0.9375rem] text-soft max-md:hidden">· {notes(plan, at)}</span>
        )}
      </span>
      <Cell head="For one" value={forOne(row.quantity, row.isAsRequired, part)} />
      <Cell
        head="Needed"
        value={row.level === 1 ? say(part.needed) : say(row.need) || (row.isAsRequired ? "" : "none")}
      />
      <Cell head="From stock" value={say(part.fromStock)} />
      <Cell head="To build" value={say(part.built)} />
      <span role="gridcell" className={`figure text-right ${stops ? "font-semibold text-stop" : ""}`}>
        <Head text="Missing" />
        {stops && plan.isSold ? (
          <Link
            tabIndex={-1}
            to={whyAddress({
              question: {
                kit: plan.partNumber,
                quantity: plan.kits,
                by: null,
                options: plan.options,
                ifs: [],
              },
              part: part.partNumber,
            })}
            className="underline"
          >
            {say(part.missing)}
            <span className="sr-only"> missing</span>
          </Link>
        ) : (
          say(part.missing)
        )}
      </span>
    </div>
  );
}

function notes(plan: StructurePlan, at: number): string {
  const { option, scrap, at: shownAt, part } = plan.rows[at];
  const { places } = plan.parts[part];
  return [
    option === null ? "" : `option ${option}`,
    scrap === null ? "" : `scrap ${scrap}`,
    shownAt === null ? "" : "its parts stand at its first place",
    places > 1 ? `at ${places} places` : "",
  ]
    .filter((word) => word !== "")
    .join(", ");
}

function forOne(
  quantity: string | null,
  isAsRequired: boolean,
  part: StructurePlan["parts"][number],
): string {
  if (isAsRequired) return "as required";
  if (quantity === null) return "";
  const unit = unitSymbol(part.unit);
  return unit === ""
    ? formatQuantity(quantity, part.decimals)
    : `${formatQuantity(quantity, part.decimals)} ${unit}`;
}

function Cell({ head, value }: { head: string; value: string }) {
  return (
    <span role="gridcell" className="figure text-right">
      <Head text={head} />
      {value}
    </span>
  );
}

/** The column's name where a row has come apart; readers hear it from the header. */
function Head({ text }: { text: string }) {
  return (
    <span aria-hidden="true" className="block font-normal font-sans text-[0.8125rem] text-soft md:hidden">
      {text}
    </span>
  );
}
