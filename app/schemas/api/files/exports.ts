import { z } from "zod";
import type { ApiRoute } from "~/schemas/api/api-route";
import { exportKindNames } from "~/schemas/exports/export-kind-name";

export const exportsRoutes: ApiRoute[] = [
  {
    id: "exportFile",
    method: "get",
    path: "/api/exports/:kind",
    summary: "One table of the book as CSV, as it is imported",
    params: z.object({ kind: z.enum(exportKindNames) }),
    answer: { type: "text/csv" },
    problems: [404],
  },
  {
    id: "exportBook",
    method: "get",
    path: "/api/exports/book",
    summary: "Everything, as one archive of CSV files",
    answer: { type: "application/zip" },
  },
];
