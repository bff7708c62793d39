import { useState } from "react";
import type { CheckPart, CheckQuestion } from "~/schemas/planning/check-answer";
import type { LadderRow } from "./ladder-rows";
import { Tag } from "./tag";
import { whyAddress } from "./why-address";

const MOST_TAGS = 6;

interface StopperTagsProps {
  fresh: LadderRow["fresh"];
  carried: LadderRow["carried"];
  parts: CheckPart[];
  question: CheckQuestion;
  /** The rung they hang on. */
  kits: number;
}

/**
 * The parts a rung hangs on. Shown are those that stop no kit below it; those known from below, and what is
 * too much for a row, fold into a button.
 */
export function StopperTags({ fresh, carried, parts, question, kits }: StopperTagsProps) {
  const [isOpen, setIsOpen] = useState(false);
  const first = fresh.slice(0, MOST_TAGS);
  const folded = [...fresh.slice(MOST_TAGS), ...carried];
  const shown = isOpen ? [...first, ...folded] : first;
  const known = new Map(parts.map((part) => [part.partNumber, part]));
  return (
    <ul className="mt-1 flex flex-wrap items-center gap-1.5">
      {shown.map((stopper) => (
        <li key={stopper.partNumber} className="max-w-full">
          <Tag
            stopper={stopper}
            part={known.get(stopper.partNumber)}
            isCarried={carried.includes(stopper)}
            to={whyAddress({ question, part: stopper.partNumber, kits })}
          />
        </li>
      ))}
      {folded.length > 0 && (
        <li>
          <button
            type="button"
            aria-expanded={isOpen}
            onClick={() => setIsOpen(!isOpen)}
            className="min-h-7 cursor-pointer px-1 text-[0.9375rem] text-soft underline decoration-dotted underline-offset-4 hover:text-ink print:hidden"
          >
            {isOpen ? "fewer" : foldedWords(fresh.length - first.length, carried.length, first.length)}
          </button>
        </li>
      )}
    </ul>
  );
}

function foldedWords(more: number, carried: number, shown: number): string {
  if (more === 0) return shown === 0 ? `${carried} as below` : `and ${carried} as below`;
  return `+${more + carried} more`;
}
