import { closeDatabase } from "~/db/client.server";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { bring } from "../imports/import-support";

/** Run as a process of its own: imports the text given as if another web process had been asked to. */
const [kind, text] = process.argv.slice(2);
const { counts } = await bring(kind as ImportKindName, text);
await closeDatabase();
process.exitCode = counts.refused === 0 ? 0 : 1;
