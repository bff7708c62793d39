export type CsvDelimiter = "," | ";" | "\t";

const candidates: readonly CsvDelimiter[] = [",", ";", "\t"];

/** The delimiter that the header line uses most; a comma where it uses none. */
export function detectDelimiter(text: string): CsvDelimiter {
  const header = /\S.*/.exec(text)?.[0].replaceAll(/"[^"]*"/g, "") ?? "";
  const uses = (delimiter: CsvDelimiter) => header.split(delimiter).length - 1;
  return candidates.reduce((best, next) => (uses(next) > uses(best) ? next : best));
}
