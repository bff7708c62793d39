import type { CurrentPerson } from "~/services/people/current-person";
import { changeRoles } from "~/services/people/manage/change-roles.server";
import { disablePerson } from "~/services/people/manage/disable-person.server";
import { enablePerson } from "~/services/people/manage/enable-person.server";
import { endTheirSession } from "~/services/people/manage/end-their-session.server";
import { endTheirToken } from "~/services/people/manage/end-their-token.server";
import { resendInvitation } from "~/services/people/manage/resend-invitation.server";
import { resetSecondFactor } from "~/services/people/second-factor/reset-second-factor.server";
import { AppError } from "~/utils/errors";
import { rowNumber } from "~/utils/row-number";

type PersonAct = (id: number, form: FormData, actor: CurrentPerson) => Promise<void>;

const ACTS: Record<string, PersonAct> = {
  roles: (id, form, actor) => changeRoles(id, { roles: form.getAll("roles") }, actor),
  disable: (id, _form, actor) => disablePerson(id, actor),
  enable: (id, _form, actor) => enablePerson(id, actor),
  "invite-again": (id, _form, actor) => resendInvitation(id, actor),
  "reset-factor": (id, _form, actor) => resetSecondFactor(id, actor),
  "end-session": (id, form, actor) => endTheirSession(id, String(form.get("session")), actor),
  "end-token": (id, form, actor) => endTheirToken(id, rowNumber(String(form.get("token"))) ?? 0, actor),
};

/**
 * Does what the pressed button of a person's page says.
 * @returns the button's name
 * @throws AppError `bad-request` for a button that is not there, and what the service throws
 */
export async function runPersonAct(id: number, form: FormData, actor: CurrentPerson): Promise<string> {
  const intent = String(form.get("intent"));
  if (!Object.hasOwn(ACTS, intent))
    throw new AppError("bad-request", "The form could not be read. Load the page again.");
  await ACTS[intent](id, form, actor);
  return intent;
}
