import type { ImportAnswer } from "~/schemas/imports/import-answer";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { importFile } from "~/services/imports/import-file.server";
import type { CurrentPerson } from "~/services/people/current-person";
import type { AppError } from "~/utils/errors";

export const manager: CurrentPerson = {
  id: null,
  name: "Greta Lindqvist",
  email: null,
  roles: ["manager"],
  via: "token",
};

/** Imports lines of text as a file. */
export function bring(
  kind: ImportKindName,
  text: string,
  options: { dryRun?: boolean; person?: CurrentPerson } = {},
) {
  const bytes = new TextEncoder().encode(text);
  return importFile(kind, { bytes, person: manager, ...options });
}

export async function refusal(promise: Promise<unknown>): Promise<AppError> {
  return promise.then(
    () => {
      throw new Error("It should have been refused.");
    },
    (error: AppError) => error,
  );
}

export function resultsOf(answer: ImportAnswer): string[] {
  return answer.rows.map((row) => row.result);
}
