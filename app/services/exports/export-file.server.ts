import type { Transaction } from "sequelize";
import type { ExportKindName } from "~/schemas/exports/export-kind-name";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { type CsvColumn, csvHeader, csvLines } from "~/utils/csv/write-csv";
import type { ExportRow } from "./export-table";
import { EXPORT_TABLES } from "./export-tables.server";

/**
 * One table of the book as CSV, piece by piece, as its import takes it; the cost columns are left out for people who
 * may not see costs. Text that looks like a formula is made harmless.
 * @throws AppError "unauthenticated", "forbidden" before the first piece
 */
export function exportFile(
  kind: ExportKindName,
  { person, transaction }: { person: CurrentPerson | null; transaction?: Transaction },
): AsyncIterable<string> {
  const table = EXPORT_TABLES[kind];
  const { roles } = assertMay(person, table.act);
  const hidden = mayDo(roles, "see-costs") ? [] : (table.costColumns ?? []);
  const columns = table.columns
    .filter((name) => !hidden.includes(name))
    .map((name): CsvColumn<ExportRow> => ({ name, cell: (row) => row[name] }));
  return writePieces(columns, table.read(transaction));
}

async function* writePieces(
  columns: readonly CsvColumn<ExportRow>[],
  pieces: AsyncIterable<ExportRow[]>,
): AsyncGenerator<string> {
  yield csvHeader(columns);
  for await (const rows of pieces) yield csvLines(columns, rows);
}
