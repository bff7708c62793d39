import { AppError } from "~/utils/errors";

const KEY = /^[\x21-\x7e]{8,200}$/;

/** The key of a request, where it is one. @throws AppError "bad-request" for one that is malformed or missing */
export function assertKey(key: string | null): string {
  if (key !== null && KEY.test(key)) return key;
  throw new AppError("bad-request", "Send an Idempotency-Key of 8 to 200 visible characters without spaces.");
}
