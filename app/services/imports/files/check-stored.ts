import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { ImportRow } from "./read-import-rows";

const mostDigits = 14;
const mostFraction = 8;

/** The problem of a quantity or amount with more digits than the book keeps; null where it fits. */
export function checkStored(
  row: ImportRow<unknown>,
  column: string,
  value: string | null,
): CsvProblem | null {
  const whole = value?.split(".")[0].replace(/^0+/, "") ?? "";
  if (whole.length <= mostDigits) return null;
  return { ...row.at(column), expected: `at most ${mostDigits} digits before the point` };
}

/** The same for a scrap or yield, of which the book keeps eight decimals. */
export function checkStoredFraction(
  row: ImportRow<unknown>,
  column: string,
  value: string,
): CsvProblem | null {
  const fraction = value.split(".")[1]?.replace(/0+$/, "") ?? "";
  if (fraction.length <= mostFraction) return null;
  return { ...row.at(column), expected: `at most ${mostFraction} decimals` };
}
