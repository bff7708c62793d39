import { publicLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";

export const loader = publicLoader(() => {
  throw new AppError("not-found", "There is nothing at this address. It may have been renamed, or mistyped.");
});

/** Never shown: the loader always throws, and root's boundary says so. */
export default function NotFound() {
  return null;
}
