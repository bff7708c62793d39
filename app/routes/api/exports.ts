import { exportKindNames } from "~/schemas/exports/export-kind-name";
import { exportFile } from "~/services/exports/export-file.server";
import { apiLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import { streamText } from "~/utils/stream-text.server";
import type { Route } from "./+types/exports";

/** `GET /api/exports/:kind`: one table of the book as CSV; the service asks who may have it. */
export const loader = apiLoader("look", ({ params }: Route.LoaderArgs, person) => {
  const kind = exportKindNames.find((name) => name === params.kind);
  if (kind === undefined) {
    const message = `There is no export of ${params.kind}; there are ${exportKindNames.join(", ")}, and book.`;
    throw new AppError("not-found", message);
  }
  return new Response(streamText(exportFile(kind, { person })), {
    headers: {
      "Content-Type": "text/csv; charset=utf-8",
      "Content-Disposition": `attachment; filename="${kind}.csv"`,
      "Cache-Control": "no-store",
    },
  });
});
