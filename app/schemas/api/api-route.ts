import type { z } from "zod";

/** One method of a JSON route, as `GET /api/openapi.json` describes it. */
export interface ApiRoute {
  /** Names the operation and, with a capital letter, the schemas of its body and answer. */
  id: string;
  method: "get" | "post";
  /** As in `app/routes.ts`: `/api/parts/:partNumber`. */
  path: string;
  summary: string;
  /** Open to all, without a session or token. */
  isPublic?: true;
  /** The parts of the path that begin with a colon; text where it is left out. */
  params?: z.ZodObject;
  query?: z.ZodObject;
  headers?: z.ZodObject;
  body?: { type: "application/json"; schema: z.ZodType } | { type: "text/csv" };
  answer:
    | { type: "application/json"; schema: z.ZodType; status?: 200 | 201; alsoWith?: readonly number[] }
    | { type: "text/csv" | "application/zip" };
  /** Statuses of its problems besides 401, 403 and those that any body can have. */
  problems?: readonly number[];
}
