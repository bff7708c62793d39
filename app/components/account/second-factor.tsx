import { Form } from "react-router";
import { Field } from "~/components/forms/field";
import { ShownOnce } from "./shown-once";

interface SecondFactorProps {
  state: "off" | "begun" | "on";
  setUp: { picture: string; secret: string } | null;
  recoveryCodesLeft: number;
  errors: Record<string, string>;
  /** Those of a second factor that was switched on just now. */
  recoveryCodes: string[] | null;
}

/** The second factor: a code from an authenticator, asked for after the password. */
export function SecondFactor({ state, setUp, recoveryCodesLeft, errors, recoveryCodes }: SecondFactorProps) {
  return (
    <section className="sheet grid gap-4" aria-label="Second factor">
      <h2 className="text-lg">
        Second factor: <span>{state === "on" ? "on" : "off"}</span>
      </h2>
      {recoveryCodes && (
        <ShownOnce
          label="Ten recovery codes, each good once in place of a code"
          text={recoveryCodes.join("\n")}
        />
      )}
      {state === "off" && <Begin />}
      {setUp && <Confirm {...setUp} error={errors.code} />}
      {state === "on" && <SwitchOff left={recoveryCodesLeft} errors={errors} />}
    </section>
  );
}

function Begin() {
  return (
    <Form method="post" className="grid gap-4">
      <p>
        After your password you type a code that changes every 30 seconds, from an authenticator on your
        phone.
      </p>
      <div>
        <button type="submit" name="intent" value="begin-factor" className="button button-main">
          Set it up
        </button>
      </div>
    </Form>
  );
}

function Confirm({ picture, secret, error }: { picture: string; secret: string; error?: string }) {
  return (
    <Form method="post" className="grid gap-4">
      <p>Let the authenticator read this picture, or type the letters below it there.</p>
      <img
        src={picture}
        alt="QR code for the authenticator; the letters below say the same"
        className="w-52"
      />
      <p className="figure [overflow-wrap:anywhere]">{secret}</p>
      <CodeField label="The code it shows now" error={error} />
      <div>
        <button type="submit" name="intent" value="confirm-factor" className="button button-main">
          Switch it on
        </button>
      </div>
    </Form>
  );
}

function SwitchOff({ left, errors }: { left: number; errors: Record<string, string> }) {
  return (
    <Form method="post" className="grid gap-4" aria-label="Switch the second factor off">
      <p>
        Recovery codes left: <span className="figure">{left}</span>. To make new ones, switch it off and set
        it up again.
      </p>
      <Field label="Password" name="factor-password" error={errors["factor-password"]}>
        {(attributes) => (
          <input {...attributes} type="password" autoComplete="current-password" required className="field" />
        )}
      </Field>
      <CodeField label="Code, or a recovery code" error={errors.code} />
      <div>
        <button type="submit" name="intent" value="end-factor" className="button">
          Switch it off
        </button>
      </div>
    </Form>
  );
}

function CodeField({ label, error }: { label: string; error?: string }) {
  return (
    <Field label={label} name="code" error={error}>
      {(attributes) => (
        <input
          {...attributes}
          autoComplete="one-time-code"
          spellCheck={false}
          required
          maxLength={40}
          className="field figure"
        />
      )}
    </Field>
  );
}
