import type { z } from "zod";
import { AppError, type FieldError } from "./errors";

/**
 * The JSON body of a request that holds a list, checked by its schema. An error within the list names its entry by
 * `line`, from 1, and the field in it: `movements.2.to.bin` is `to.bin` of line 3.
 * @throws AppError `bad-request` for what is no JSON, `invalid` for the rest, with the sentence given
 */
export async function readJsonLines<S extends z.ZodType>(
  request: Request,
  schema: S,
  sentence: string,
): Promise<z.output<S>> {
  const text = await request.text();
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new AppError("bad-request", "The body is not valid JSON.");
  }
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  throw new AppError("invalid", sentence, { errors: parsed.error.issues.flatMap(toErrors) });
}

function toErrors({ path, message, ...issue }: z.core.$ZodIssue): FieldError[] {
  if (issue.code !== "unrecognized_keys") return [nameLine(path, message)];
  return issue.keys.map((key) => nameLine([...path, key], "There is no such field; leave it out."));
}

function nameLine(path: readonly PropertyKey[], message: string): FieldError {
  const [, entry, ...within] = path;
  if (typeof entry !== "number") return { field: path.join("."), message };
  return { line: entry + 1, field: within.join("."), message };
}
