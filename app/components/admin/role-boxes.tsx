import { FieldError } from "~/components/forms/field";
import { ROLE_NAMES, ROLES, type Role } from "~/schemas/people/role";

const WORK: Record<Role, string> = {
  clerk: "counts, receives, puts away",
  planner: "plans, keeps parts and kit orders",
  purchaser: "buys, sees prices",
  builder: "picks and builds",
  manager: "may do all of it",
};

interface RoleBoxesProps {
  chosen: readonly Role[];
  error?: string;
}

/** The roles to tick, each with what it is for. */
export function RoleBoxes({ chosen, error }: RoleBoxesProps) {
  return (
    <fieldset aria-describedby={error ? "roles-error" : undefined}>
      <legend className="font-bold">Roles</legend>
      <div className="mt-1 grid gap-x-6 sm:grid-cols-2">
        {ROLES.map((role) => (
          <label key={role} className="flex min-h-11 items-center gap-3 py-1">
            <input
              type="checkbox"
              name="roles"
              value={role}
              defaultChecked={chosen.includes(role)}
              className="size-6 shrink-0"
            />
            <span className="leading-snug">
              {ROLE_NAMES[role]}
              <span className="block text-[0.9375rem] text-soft">{WORK[role]}</span>
            </span>
          </label>
        ))}
      </div>
      {error && <FieldError id="roles-error" error={error} />}
    </fieldset>
  );
}
