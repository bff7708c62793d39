import { partKey } from "~/domain/planning/part-key";
import type { PartRow } from "~/schemas/imports/parts";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { checkDecimals } from "./check-decimals";
import type { ImportRow } from "./read-import-rows";

const ownQuantities = [
  ["safety_stock", "safetyStock"],
  ["lot_minimum", "lotMinimum"],
  ["lot_multiple", "lotMultiple"],
  ["lot_maximum", "lotMaximum"],
] as const;

/** What is wrong across the rows of a parts file: part numbers given twice, quantities finer than the part. */
export function checkParts(rows: readonly ImportRow<PartRow>[]): CsvProblem[] {
  const lines = new Map<string, number>();
  const problems: CsvProblem[] = [];
  for (const row of rows) {
    const key = partKey(row.value.partNumber);
    const first = lines.get(key);
    if (first === undefined) lines.set(key, row.line);
    else {
      const found = `duplicate part number "${row.value.partNumber}", already on line ${first}`;
      problems.push({ ...row.at("part_number"), found, expected: "each part number once" });
    }
    for (const [column, field] of ownQuantities) {
      const problem = checkDecimals(row, column, row.value[field], row.value);
      if (problem) problems.push(problem);
    }
  }
  return problems;
}
