import type { AppError } from "~/utils/errors";
import { toProblem } from "~/utils/problem";

interface FormFault {
  /** About the whole form; undefined where the fields say it all. */
  notice?: string;
  /** The first fault of each field. */
  fields: Record<string, string>;
}

/** What a form shows of an error, and the status and headers to answer with. */
export function formFault(error: AppError): { fault: FormFault; init: ResponseInit } {
  const fields: Record<string, string> = {};
  for (const { field, message } of error.errors) if (field !== undefined) fields[field] ??= message;
  const { status, retryAfter } = toProblem(error);
  const headers = retryAfter === undefined ? undefined : { "Retry-After": String(retryAfter) };
  const notice = Object.keys(fields).length > 0 ? undefined : error.message;
  return { fault: { notice, fields }, init: { status, headers } };
}
