import { Form } from "react-router";
import { Field } from "~/components/forms/field";

/** Changes the password of the person who is signed in. */
export function PasswordForm({ errors }: { errors: Record<string, string> }) {
  return (
    <Form method="post" className="sheet grid gap-4" aria-label="Password">
      <h2 className="text-lg">Password</h2>
      <Field label="Present password" name="present" error={errors.present}>
        {(attributes) => (
          <input {...attributes} type="password" autoComplete="current-password" required className="field" />
        )}
      </Field>
      <Field
        label="New password"
        name="password"
        hint="At least 12 characters; a short sentence is easy to keep in mind."
        error={errors.password}
      >
        {(attributes) => (
          <input {...attributes} type="password" autoComplete="new-password" required className="field" />
        )}
      </Field>
      <p className="text-soft">Every other session of yours ends with it; tokens go on.</p>
      <div>
        <button type="submit" name="intent" value="password" className="button button-main">
          Change the password
        </button>
      </div>
    </Form>
  );
}
