import { codeSchema } from "~/schemas/people/account";
import { changePassword } from "~/services/people/account/change-password.server";
import { endOwnSessions } from "~/services/people/account/end-own-sessions.server";
import { makeOwnToken } from "~/services/people/account/make-own-token.server";
import { withdrawOwnToken } from "~/services/people/account/withdraw-own-token.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { beginSecondFactor } from "~/services/people/second-factor/begin-second-factor.server";
import { confirmSecondFactor } from "~/services/people/second-factor/confirm-second-factor.server";
import { endSecondFactor } from "~/services/people/second-factor/end-second-factor.server";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import { rowNumber } from "~/utils/row-number";

interface Here {
  sessionId: string;
  address: string;
}

/** What is shown once, where something was made. */
interface Made {
  token: string | null;
  recoveryCodes: string[] | null;
}

type AccountAct = (form: FormData, person: CurrentPerson, here: Here) => Promise<unknown>;

const NOTHING: Made = { token: null, recoveryCodes: null };

/** Acts after which the page is loaded anew. */
const ACTS: Record<string, AccountAct> = {
  password: (form, person, here) => changePassword(Object.fromEntries(form), person, here),
  "end-session": (form, person, { sessionId }) =>
    endOwnSessions({ key: String(form.get("session")) }, person, sessionId),
  "end-others": (_form, person, { sessionId }) => endOwnSessions("others", person, sessionId),
  "end-token": (form, person) => withdrawOwnToken(rowNumber(String(form.get("token"))) ?? 0, person),
  "begin-factor": (_form, person) => beginSecondFactor(person),
  "end-factor": (form, person, { address }) =>
    endSecondFactor({ password: String(form.get("factor-password")), code: codeOf(form), address }, person),
};

const MAKING: Record<string, (form: FormData, person: CurrentPerson, here: Here) => Promise<Made>> = {
  "make-token": async (form, person) => ({
    ...NOTHING,
    token: await makeOwnToken(Object.fromEntries(form), person),
  }),
  "confirm-factor": async (form, person, { address }) => ({
    ...NOTHING,
    recoveryCodes: await confirmSecondFactor(codeOf(form), person, address),
  }),
};

function codeOf(form: FormData): string {
  return parseInput(codeSchema, Object.fromEntries(form)).code;
}

/**
 * Does what the pressed button of the account says.
 * @returns the button's name, and what was made to be shown once
 * @throws AppError `bad-request` for a button that is not there, and what the service throws
 */
export async function runAccountAct(
  form: FormData,
  person: CurrentPerson,
  here: Here,
): Promise<{ intent: string; made: Made | null }> {
  const intent = String(form.get("intent"));
  if (Object.hasOwn(MAKING, intent)) return { intent, made: await MAKING[intent](form, person, here) };
  if (!Object.hasOwn(ACTS, intent))
    throw new AppError("bad-request", "The form could not be read. Load the page again.");
  await ACTS[intent](form, person, here);
  return { intent, made: null };
}
