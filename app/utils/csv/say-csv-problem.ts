import type { CsvProblem } from "./csv-problem";

const longestValue = 80;

function sayFound({ found, value }: CsvProblem): string {
  if (found !== undefined) return found;
  if (value === null) return "nothing";
  if (value === "") return "an empty cell";
  const shown = value.length > longestValue ? `${value.slice(0, longestValue)}…` : value;
  return JSON.stringify(shown);
}

/** `parts.csv, line 4, column decimals: found "9"; expected a whole number from 0 to 6.` */
export function sayCsvProblem(problem: CsvProblem, file?: string): string {
  const place = [
    file,
    problem.line === null ? undefined : `line ${problem.line}`,
    problem.column === null ? undefined : `column ${problem.column}`,
  ].filter((word) => word !== undefined);
  const said = `found ${sayFound(problem)}; expected ${problem.expected}.`;
  return place.length === 0 ? said : `${place.join(", ")}: ${said}`;
}
