import type { ImportAnswer, ImportLine, ImportResult } from "~/schemas/imports/import-answer";
import { sameValues } from "~/services/imports/decide/same-values";
import type { RefusedRow } from "~/services/imports/files/read-import-rows";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { sayCsvProblem } from "~/utils/csv/say-csv-problem";
import type { FieldError } from "~/utils/errors";
import type { Decision, ImportPlan } from "./import-job";

/** A problem of the file as an error of the answer. */
export function presentProblem(problem: CsvProblem): FieldError {
  const { line, column, value, unknownHeader } = problem;
  return {
    ...(line === null ? {} : { line }),
    ...(column === null ? {} : { column }),
    ...(value === null ? {} : { value }),
    ...(unknownHeader ? { unknownHeader } : {}),
    message: sayCsvProblem(problem),
  };
}

function resultOf({ before, after, problems }: Decision): ImportResult {
  if (problems.length > 0) return "refused";
  if (before === null) return "new";
  return sameValues(before, after) ? "same" : "changed";
}

/** Puts the rows that were refused one by one between those that were decided, line by line, and counts them. */
export function presentRows(
  { decisions, removed = [] }: Pick<ImportPlan, "decisions" | "removed">,
  refused: readonly RefusedRow[],
): Pick<ImportAnswer, "rows" | "removed" | "counts"> {
  const decided = decisions.map(
    (decision): ImportLine => ({
      line: decision.row.line,
      result: resultOf(decision),
      before: decision.before,
      after: decision.after,
      errors: decision.problems.map(presentProblem),
      notes: decision.notes ?? [],
    }),
  );
  const unread = refused.map(({ line, problems }): ImportLine => {
    const errors = problems.map(presentProblem);
    return { line, result: "refused", before: null, after: null, errors, notes: [] };
  });
  const rows = [...decided, ...unread].sort((a, b) => a.line - b.line);
  const counts = { new: 0, changed: 0, same: 0, refused: 0, removed: removed.length };
  for (const { result } of rows) counts[result] += 1;
  return { rows, removed: [...removed], counts };
}
