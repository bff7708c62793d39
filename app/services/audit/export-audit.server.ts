import type { AuditSearch } from "~/schemas/people/audit-search";
import { type CsvColumn, csvHeader, csvLines } from "~/utils/csv/write-csv";
import { findAuditEvents, type ListedEvent } from "./find-audit-events.server";

const PIECE = 1000;

const COLUMNS: CsvColumn<ListedEvent>[] = [
  { name: "number", cell: ({ id }) => id },
  { name: "at", cell: ({ at }) => at },
  { name: "who", cell: ({ who }) => who },
  { name: "act", cell: ({ act }) => act },
  { name: "subject", cell: ({ subject }) => subject },
  { name: "before", cell: ({ before }) => before },
  { name: "after", cell: ({ after }) => after },
];

/** What a search of the audit finds, all of it, as CSV: newest first, a thousand events at a time. */
export async function* exportAudit(search: AuditSearch): AsyncGenerator<string> {
  yield csvHeader(COLUMNS);
  let below: number | null = null;
  do {
    const { events, next } = await findAuditEvents(search, { below, size: PIECE });
    yield csvLines(COLUMNS, events);
    below = next;
  } while (below !== null);
}
