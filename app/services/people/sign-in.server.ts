import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { signInSchema } from "~/schemas/people/sign-in";
import { requestAddress } from "~/utils/request-address";
import { parseInput, refuseBrokenForm } from "~/utils/request-body";
import { readSessionId } from "~/utils/session-cookie";
import { checkCredentials } from "./check-credentials.server";
import { beginSignIn } from "./second-factor/begin-sign-in.server";
import { startSession } from "./start-session.server";

const authenticator = new Authenticator<number>();

authenticator.use(
  new FormStrategy(({ form, request }) => {
    const credentials = parseInput(signInSchema, Object.fromEntries(form));
    return checkCredentials({ ...credentials, address: requestAddress(request.headers) });
  }),
  "form",
);

/**
 * Signs in by the form in the request's body.
 * @returns the id for the cookie: of the new session, or of a half sign-in where the code is still owed
 * @throws AppError `invalid` with errors by field or for the whole, `too-many`
 */
export async function signIn(request: Request): Promise<{ id: string; isHalf: boolean }> {
  const personId = await authenticator.authenticate("form", request).catch(refuseBrokenForm);
  const half = await beginSignIn(personId);
  if (half !== null) return { id: half, isHalf: true };
  return { id: await startSession(personId, readSessionId(request.headers), request.headers), isHalf: false };
}
