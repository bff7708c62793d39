import type { IsoDate } from "~/domain/planning/types";
import { formatDate } from "~/utils/format/format-date";

interface DateBlankProps {
  by: IsoDate | null;
  today: string | undefined;
  onChange: (by: IsoDate | null) => void;
}

/** By when: said in words, and a date field over them as soon as one comes to it. */
export function DateBlank({ by, today, onChange }: DateBlankProps) {
  return (
    <span className="inline-flex items-center gap-x-1">
      <span className="blank relative">
        <span aria-hidden="true" className="font-bold">
          {by === null ? "any date" : formatDate(by, { today })}
        </span>
        <input
          type="date"
          name="by"
          aria-label="By which date, empty for any"
          key={by ?? "any"}
          defaultValue={by ?? ""}
          min="2000-01-01"
          max="2999-12-31"
          onBlur={(event) => {
            const next = event.target.value || null;
            if (next !== by && event.target.validity.valid) onChange(next);
          }}
          onKeyDown={(event) => event.key === "Enter" && event.currentTarget.blur()}
          className="figure absolute top-0 left-0 z-10 h-full w-full bg-paper text-lg opacity-0 outline-none focus:w-auto focus:min-w-full focus:border-ink focus:border-b-[3px] focus:opacity-100"
        />
      </span>
      {by !== null && (
        <button
          type="button"
          aria-label="Any date"
          onClick={() => onChange(null)}
          className="grid size-8 cursor-pointer place-items-center text-soft hover:text-ink print:hidden"
        >
          <svg
            viewBox="0 0 12 12"
            aria-hidden="true"
            className="size-3"
            stroke="currentColor"
            strokeWidth="2"
          >
            <path d="M1 1l10 10M11 1L1 11" />
          </svg>
        </button>
      )}
    </span>
  );
}
