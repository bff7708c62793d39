import type { ImportKind } from "~/schemas/imports/import-kind";

/** The columns of a kind of file, the required ones first. */
export function columnsOf(kind: Pick<ImportKind<unknown>, "columns">): string[] {
  return [...kind.columns.required, ...kind.columns.optional];
}
