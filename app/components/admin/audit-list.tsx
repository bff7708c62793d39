import { formatMoment } from "~/utils/format/format-moment";
import { changeLines } from "./change-lines";

interface AuditListProps {
  events: {
    id: number;
    at: string;
    who: string | null;
    act: string;
    subject: string;
    before: string | null;
    after: string | null;
  }[];
}

/** Who did what to which thing, and what was there before and after. */
export function AuditList({ events }: AuditListProps) {
  return (
    <ol className="sheet" aria-label="Events">
      {events.map((event) => (
        <li
          key={event.id}
          className="grid gap-x-6 gap-y-1 border-line border-b py-3 last:border-b-0 md:grid-cols-[14rem_minmax(0,1fr)_minmax(0,2fr)]"
        >
          <p className="figure text-soft">{formatMoment(event.at)}</p>
          <p className="[overflow-wrap:anywhere]">
            <span className="font-bold">{event.who ?? "the program"}</span>
            <span className="block">{event.act.replaceAll("-", " ")}</span>
            <span className="figure block">{event.subject}</span>
          </p>
          <Changes before={event.before} after={event.after} />
        </li>
      ))}
    </ol>
  );
}

function Changes({ before, after }: { before: string | null; after: string | null }) {
  const lines = changeLines(before, after);
  if (lines.length === 0) return <p className="text-soft">nothing was written down beside it</p>;
  return (
    <ul className="flex flex-wrap content-start gap-x-6 gap-y-1">
      {lines.map((line) => (
        <li key={line.name} className="[overflow-wrap:anywhere]">
          <span className="text-soft">{line.name}:</span>{" "}
          {line.before !== null && line.after !== null ? (
            <>
              <span className="sr-only">from </span>
              {line.before} <span aria-hidden="true">→</span>
              <span className="sr-only">to</span> {line.after}
            </>
          ) : (
            (line.after ?? <>{line.before}, before</>)
          )}
        </li>
      ))}
    </ul>
  );
}
