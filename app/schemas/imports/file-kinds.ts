import type { ExportKindName } from "~/schemas/exports/export-kind-name";
import type { ImportKindName } from "./import-kind-name";

/** A kind of file that comes in: its columns, and headers that were matched by hand before. */
export interface IncomingKind {
  name: ImportKindName;
  required: readonly string[];
  optional: readonly string[];
  headers: Readonly<Record<string, string>>;
}

/** What the page of files offers a person. */
export interface FileKinds {
  incoming: IncomingKind[];
  outgoing: ExportKindName[];
  mayTakeBook: boolean;
}
