import { formatDate } from "~/utils/format/format-date";

/** The day something is due, and whether that day has passed. */
export function DueWords({ due, today }: { due: string | null; today: string }) {
  if (due === null) return <span className="text-soft">no date</span>;
  return (
    <>
      <span className="figure whitespace-nowrap">{formatDate(due, { today, short: true })}</span>
      {due < today && <strong className="whitespace-nowrap"> overdue</strong>}
    </>
  );
}
