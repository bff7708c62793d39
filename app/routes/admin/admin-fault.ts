import { data } from "react-router";
import { AppError } from "~/utils/errors";
import { toProblem } from "~/utils/problem";

/**
 * What a form of these pages shows of a refusal.
 * @throws the error itself where it is no refusal that a form can show
 */
export function adminFault(error: unknown) {
  if (!(error instanceof AppError) || !["conflict", "invalid", "not-found"].includes(error.code)) throw error;
  const fields: Record<string, string> = {};
  for (const { field, message } of error.errors)
    if (field !== undefined) fields[field.split(".")[0]] ??= message;
  const notice = Object.keys(fields).length > 0 ? null : error.message;
  return data({ notice, fields }, { status: toProblem(error).status });
}
