import { Form } from "react-router";
import { formatMoment } from "~/utils/format/format-moment";
import type { PersonFacts } from "./person-facts";

interface PlaceFormProps {
  state: PersonFacts["state"];
  /** ISO; null where no invitation works. */
  invitedUntil: string | null;
  hasSecondFactor: boolean;
}

/** Keeping a person out, letting them in again, inviting them once more. */
export function PlaceForm({ state, invitedUntil, hasSecondFactor }: PlaceFormProps) {
  return (
    <Form method="post" className="sheet grid gap-4" aria-label="Place of this person">
      <h2 className="text-lg">Place</h2>
      {state === "invited" && (
        <>
          <p>
            {invitedUntil === null ? (
              "The invitation is too old or was withdrawn. Send another."
            ) : (
              <>
                Invited; the link works until <span className="figure">{formatMoment(invitedUntil)}</span>.
              </>
            )}
          </p>
          <div>
            <button type="submit" name="intent" value="invite-again" className="button">
              Send another invitation
            </button>
          </div>
        </>
      )}
      {state === "disabled" ? (
        <>
          <p>Kept out: no session, token or link of theirs works. What they did stays under their name.</p>
          <div>
            <button type="submit" name="intent" value="enable" className="button button-main">
              Let them in again
            </button>
          </div>
        </>
      ) : (
        <>
          <p className="text-soft">
            Keeping somebody out ends their sessions and tokens at once. What they did stays under their name.
          </p>
          <div>
            <button type="submit" name="intent" value="disable" className="button">
              Keep this person out
            </button>
          </div>
        </>
      )}
      {hasSecondFactor && (
        <>
          <p className="text-soft">For somebody who has lost their authenticator and recovery codes.</p>
          <div>
            <button type="submit" name="intent" value="reset-factor" className="button">
              Take the second factor away
            </button>
          </div>
        </>
      )}
    </Form>
  );
}
