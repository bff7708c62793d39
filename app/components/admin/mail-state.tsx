import { formatMoment } from "~/utils/format/format-moment";
import type { MailFacts } from "./mail-facts";
import { sayMailState } from "./mail-words";

const SHAPES: Record<MailFacts["state"], string> = {
  waiting: "M8 2.5a5.5 5.5 0 1 0 .01 0z M8 5v3.2l2 1.4",
  sent: "M2 8.5l4 4 8-9",
  caught: "M2 9h3.5l1 2h3l1-2H14 M2 9l2-6h8l2 6v4.5H2z",
  dead: "M3 3l10 10 M13 3L3 13",
};

/** Where a mail stands: a shape and words, and what the last try said. */
export function MailState({ mail }: { mail: MailFacts }) {
  return (
    <div>
      <p className="flex gap-2">
        <svg
          viewBox="0 0 16 16"
          aria-hidden="true"
          className="mt-1 size-4 shrink-0"
          fill="none"
          stroke="currentColor"
        >
          <path d={SHAPES[mail.state]} strokeWidth="1.6" />
        </svg>
        {sayMailState(mail)}
      </p>
      {mail.fault && (
        <p className="text-[0.9375rem] text-soft [overflow-wrap:anywhere]">
          The mail server: {mail.fault}
          {mail.state === "waiting" && (
            <>
              {" "}
              Next try <span className="figure">{formatMoment(mail.nextAt)}</span>.
            </>
          )}
        </p>
      )}
    </div>
  );
}
