import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { signInSchema } from "~/schemas/people/sign-in";
import { requestAddress } from "~/utils/request-address";
import { parseInput, refuseBrokenForm } from "~/utils/request-body";
import { readSessionId } from "~/utils/session-cookie";
import { checkCredentials } from "./check-credentials.server";
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
 * @returns the id of the new session, for the cookie
 * @throws AppError `invalid` with errors by field or for the whole, `too-many`
 */
export async function signIn(request: Request): Promise<string> {
  const personId = await authenticator.authenticate("form", request).catch(refuseBrokenForm);
  return startSession(personId, readSessionId(request.headers));
}
