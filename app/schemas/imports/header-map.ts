import { z } from "zod";

const MOST_HEADERS = 100;

/** Headers matched by hand, as JSON text: the file's header to a column of ours, or to "" to leave it out. */
export const headerMapSchema = z
  .string()
  .max(20_000)
  .transform((text, ctx): unknown => {
    try {
      return JSON.parse(text);
    } catch {
      ctx.addIssue({ code: "custom", message: `headers is JSON such as {"Part no.":"part_number"}.` });
      return z.NEVER;
    }
  })
  .pipe(
    z
      .record(z.string().max(500), z.string().max(64))
      .refine(
        (map) => Object.keys(map).length <= MOST_HEADERS,
        `At most ${MOST_HEADERS} headers are matched.`,
      ),
  );
