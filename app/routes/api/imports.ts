import { headerMapSchema } from "~/schemas/imports/header-map";
import { type ImportKindName, importKindNames } from "~/schemas/imports/import-kind-name";
import { importFile } from "~/services/imports/import-file.server";
import { apiAction } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/imports";

function kindOf(text: string): ImportKindName {
  const kind = importKindNames.find((name) => name === text);
  if (kind) return kind;
  throw new AppError("not-found", `There is no import of ${text}; there are ${importKindNames.join(", ")}.`);
}

function isDryRun(url: URL): boolean {
  const given = url.searchParams.get("dryRun");
  if (given === null || given === "0") return false;
  if (given === "1") return true;
  throw new AppError("bad-request", "Send dryRun=1 to try an import, or leave it out to do it.");
}

/** `POST /api/imports/:kind?dryRun=1[&headers={"theirs":"ours"}]` with a body of `text/csv`; the service asks who may import this kind. */
export const action = apiAction(
  "look",
  async ({ request, params, url }: Route.ActionArgs, person) => {
    const kind = kindOf(params.kind);
    const dryRun = isDryRun(url);
    const headers = parseInput(headerMapSchema, url.searchParams.get("headers") ?? "{}");
    return importFile(kind, { bytes: new Uint8Array(await request.arrayBuffer()), person, dryRun, headers });
  },
  ["text/csv"],
);
