import type { AppError } from "~/utils/errors";

/** A refused form: one sentence a field, or one for the whole. */
export interface FormRefusal {
  errors: Record<string, string>;
  problem?: string;
}

/** Errors of a service by field; several of one field become one text. */
export function formRefusal(error: Pick<AppError, "errors" | "message">): FormRefusal {
  const errors: Record<string, string> = {};
  for (const { field, message } of error.errors) {
    const name = field?.split(".")[0];
    if (name) errors[name] = errors[name] ? `${errors[name]} ${message}` : message;
  }
  return Object.keys(errors).length > 0 ? { errors } : { errors, problem: error.message };
}
