import { z } from "zod";

/** A cell that may be left empty, and what an empty one means. The fallback is the typed value itself. */
export function emptyAs<Field extends z.ZodType, Fallback>(field: Field, fallback: Fallback) {
  return z.string().transform((cell, ctx): z.output<Field> | Fallback => {
    if (cell.trim() === "") return fallback;
    const parsed = field.safeParse(cell);
    if (parsed.success) return parsed.data;
    for (const { message } of parsed.error.issues) ctx.addIssue({ code: "custom", message, input: cell });
    return z.NEVER;
  });
}
