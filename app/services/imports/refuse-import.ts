import type { CsvProblem } from "~/utils/csv/csv-problem";
import { AppError, type FieldError } from "~/utils/errors";
import { presentProblem } from "./present-import";

const mostErrors = 100;

/** The file as a whole cannot be read. */
export function refuseFile(problems: readonly CsvProblem[]): AppError {
  return new AppError("invalid", "The file cannot be read; nothing was changed.", {
    errors: problems.map(presentProblem),
  });
}

/** Some of its rows cannot be taken. */
export function refuseRows(errors: readonly FieldError[], refused: number): AppError {
  const rows = refused === 1 ? "One row is" : `${refused} rows are`;
  return new AppError("invalid", `${rows} refused; nothing was changed. Mend the file and send it again.`, {
    errors: errors.slice(0, mostErrors),
  });
}
