import { exportBook } from "~/services/exports/export-book.server";
import { apiLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/export-book";

/** `GET /api/exports/book`: everything, as one archive of CSV files. */
export const loader = apiLoader("backup", async (_args: Route.LoaderArgs, person) => {
  return new Response(await exportBook(person), {
    headers: {
      "Content-Type": "application/zip",
      "Content-Disposition": 'attachment; filename="cotterpin-book.zip"',
      "Cache-Control": "no-store",
    },
  });
});
