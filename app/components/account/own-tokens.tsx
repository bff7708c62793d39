import { Form } from "react-router";
import { TokenList } from "~/components/admin/token-list";
import { Field } from "~/components/forms/field";
import { ROLE_NAMES, type Role } from "~/schemas/people/role";
import { ShownOnce } from "./shown-once";

interface OwnTokensProps {
  tokens: { id: number; name: string; role: Role | null; createdAt: string }[];
  /** That a token may have. */
  roles: readonly Role[];
  errors: Record<string, string>;
  /** The token that was made just now. */
  made: string | null;
}

/** One's own tokens for the JSON routes, and the form that makes one. */
export function OwnTokens({ tokens, roles, errors, made }: OwnTokensProps) {
  return (
    <div className="grid gap-4">
      <TokenList title="Tokens for programs" tokens={tokens} empty="None." />
      <Form method="post" className="sheet grid gap-4" aria-label="New token">
        <h2 className="text-lg">Make a token</h2>
        <p className="text-soft">
          A program sends it as <span className="figure">Authorization: Bearer …</span> and may do what its
          role may, as long as you have that role.{" "}
          <a href="/api/openapi.json" className="underline">
            What it can ask
          </a>
        </p>
        {made && <ShownOnce label="The new token" text={made} />}
        <Field label="What it is for" name="name" error={errors.name}>
          {(attributes) => (
            <input {...attributes} autoComplete="off" required maxLength={120} className="field" />
          )}
        </Field>
        <Field label="Role" name="role" error={errors.role}>
          {(attributes) => (
            <select {...attributes} className="field">
              {roles.map((role) => (
                <option key={role} value={role}>
                  {ROLE_NAMES[role]}
                </option>
              ))}
            </select>
          )}
        </Field>
        <div>
          <button type="submit" name="intent" value="make-token" className="button">
            Make the token
          </button>
        </div>
      </Form>
    </div>
  );
}
