import { z } from "zod";
import { importFileAnswer } from "~/schemas/api/answers/import-file";
import type { ApiRoute } from "~/schemas/api/api-route";
import { importKindNames } from "~/schemas/imports/import-kind-name";

export const importsRoutes: ApiRoute[] = [
  {
    id: "importFile",
    method: "post",
    path: "/api/imports/:kind",
    summary: "Bring in a CSV file, all or nothing; with dryRun=1 only say what would change, line by line",
    params: z.object({ kind: z.enum(importKindNames) }),
    query: z.object({
      dryRun: z.enum(["0", "1"]).optional(),
      headers: z.string().optional().describe('Headers matched by hand, as JSON: {"Part no.":"part_number"}'),
    }),
    body: { type: "text/csv" },
    answer: { type: "application/json", schema: importFileAnswer },
    problems: [404, 409],
  },
];
