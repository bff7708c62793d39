import { parseSteps } from "~/domain/quantity/parse-steps";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { ImportRow } from "./read-import-rows";

/** The problem of a quantity that is finer than its part's unit is counted; null where it fits. */
export function checkDecimals(
  row: ImportRow<unknown>,
  column: string,
  quantity: string | null,
  part: { partNumber: string; decimals: number },
): CsvProblem | null {
  if (quantity === null || parseSteps(quantity, part.decimals).ok) return null;
  const most = part.decimals === 0 ? "a whole number" : `at most ${part.decimals} decimals`;
  return { ...row.at(column), expected: `${most}, as part ${part.partNumber} is counted` };
}
