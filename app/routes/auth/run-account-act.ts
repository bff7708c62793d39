import { changePassword } from "~/services/people/account/change-password.server";
import { endOwnSessions } from "~/services/people/account/end-own-sessions.server";
import { makeOwnToken } from "~/services/people/account/make-own-token.server";
import { withdrawOwnToken } from "~/services/people/account/withdraw-own-token.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { AppError } from "~/utils/errors";
import { rowNumber } from "~/utils/row-number";

interface Here {
  sessionId: string;
  address: string;
}

type AccountAct = (form: FormData, person: CurrentPerson, here: Here) => Promise<unknown>;

const ACTS: Record<string, AccountAct> = {
  password: (form, person, here) => changePassword(Object.fromEntries(form), person, here),
  "end-session": (form, person, { sessionId }) =>
    endOwnSessions({ key: String(form.get("session")) }, person, sessionId),
  "end-others": (_form, person, { sessionId }) => endOwnSessions("others", person, sessionId),
  "make-token": (form, person) => makeOwnToken(Object.fromEntries(form), person),
  "end-token": (form, person) => withdrawOwnToken(rowNumber(String(form.get("token"))) ?? 0, person),
};

/**
 * Does what the pressed button of the account says.
 * @returns the button's name, and the token where one was made
 * @throws AppError `bad-request` for a button that is not there, and what the service throws
 */
export async function runAccountAct(form: FormData, person: CurrentPerson, here: Here) {
  const intent = String(form.get("intent"));
  if (!Object.hasOwn(ACTS, intent))
    throw new AppError("bad-request", "The form could not be read. Load the page again.");
  const made = await ACTS[intent](form, person, here);
  return { intent, token: intent === "make-token" ? String(made) : null };
}
