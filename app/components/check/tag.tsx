import { Link } from "react-router";
import type { Rung } from "~/domain/planning/types";
import type { CheckPart } from "~/schemas/planning/check-answer";
import { formatQuantity } from "~/utils/format/format-quantity";
import { unitSymbol } from "~/utils/format/unit-symbol";

interface TagProps {
  stopper: Rung["stoppers"][number];
  part: CheckPart | undefined;
  /** Stops a kit below as well: paler. */
  isCarried: boolean;
  /** Where the number opens to its causes. */
  to: string;
}

/** A tied-on tag: the part number and how many are missing. */
export function Tag({ stopper, part, isCarried, to }: TagProps) {
  const unit = unitSymbol(part?.unit ?? "EA");
  const ground = isCarried ? "fill-transparent" : "fill-stop-wash";
  return (
    <Link to={to} preventScrollReset className="group flex max-w-full no-underline" title={part?.description}>
      <svg
        viewBox="0 0 12 28"
        aria-hidden="true"
        focusable="false"
        className={`h-7 w-3 shrink-0 stroke-stop ${ground}`}
      >
        <path d="M12.5 .5H9L.5 9v10L9 27.5h3.5" />
        <circle cx="7.5" cy="14" r="1.9" className="fill-paper" />
      </svg>
      <span
        className={`figure flex min-w-0 items-center gap-2 border-stop border-y border-r pr-2 pl-1 text-[0.8125rem] ${
          isCarried ? "" : "bg-stop-wash"
        }`}
      >
        <span className="truncate group-hover:underline">{stopper.partNumber}</span>
        <span className="shrink-0 font-semibold text-stop">
          {formatQuantity(stopper.missing, part?.decimals ?? 0)}
          {unit === "" ? "" : ` ${unit}`}
          <span className="sr-only"> missing</span>
        </span>
      </span>
    </Link>
  );
}
