import { exportKindNames } from "~/schemas/exports/export-kind-name";
import type { FileKinds } from "~/schemas/imports/file-kinds";
import { importKindNames } from "~/schemas/imports/import-kind-name";
import { EXPORT_TABLES } from "~/services/exports/export-tables.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getHeaders } from "./get-headers.server";
import { IMPORT_ACTS, IMPORT_COLUMNS } from "./import-kinds";

/** The kinds of file that the person may bring in, with how headers were matched before, and those that they may take out. */
export async function getFileKinds(person: CurrentPerson): Promise<FileKinds> {
  const mine = importKindNames.filter((name) => mayDo(person.roles, IMPORT_ACTS[name]));
  return {
    incoming: await Promise.all(
      mine.map(async (name) => ({ name, ...IMPORT_COLUMNS[name], headers: await getHeaders(name) })),
    ),
    outgoing: exportKindNames.filter((name) => mayDo(person.roles, EXPORT_TABLES[name].act)),
    mayTakeBook: mayDo(person.roles, "backup"),
  };
}
