import { Form, useNavigation } from "react-router";
import { Field } from "~/components/forms/field";
import { RoleBoxes } from "./role-boxes";

interface InviteFormProps {
  /** The first fault of each field. */
  errors: Record<string, string>;
}

/** Name, address and roles of somebody new; the password is theirs to choose. */
export function InviteForm({ errors }: InviteFormProps) {
  const isBusy = useNavigation().formData?.get("intent") === "invite";
  return (
    <section className="sheet" aria-label="Invite somebody">
      <h2 className="text-lg">Invite somebody</h2>
      <p className="text-soft">They get a mail and choose their own password within seven days.</p>
      <Form method="post" className="mt-4 grid gap-4">
        <Field label="Name" name="name" error={errors.name}>
          {(attributes) => (
            <input {...attributes} className="field" required maxLength={120} autoComplete="off" />
          )}
        </Field>
        <Field label="E-mail address" name="email" error={errors.email}>
          {(attributes) => (
            <input {...attributes} type="email" className="field" required autoComplete="off" />
          )}
        </Field>
        <RoleBoxes chosen={[]} error={errors.roles} />
        <div>
          <button
            type="submit"
            name="intent"
            value="invite"
            className="button button-main min-h-12"
            aria-disabled={isBusy}
          >
            {isBusy ? "Inviting…" : "Send the invitation"}
          </button>
        </div>
      </Form>
    </section>
  );
}
