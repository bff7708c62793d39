import { AppError } from "~/utils/errors";

/** A change that cannot be: 422 naming its place in `change`, with a sentence for the person. */
export function refuseChange(place: string, value: string, message: string): AppError {
  return new AppError("invalid", message, { errors: [{ field: `change.${place}`, value, message }] });
}
