import { Form } from "react-router";
import { ROLE_NAMES, type Role } from "~/schemas/people/role";
import { formatMoment } from "~/utils/format/format-moment";

interface TokenListProps {
  title: string;
  tokens: { id: number; name: string; role: Role | null; createdAt: string }[];
  empty: string;
}

/** Tokens that work, each with a button that ends it. */
export function TokenList({ title, tokens, empty }: TokenListProps) {
  return (
    <section className="sheet" aria-label={title}>
      <h2 className="text-lg">{title}</h2>
      {tokens.length === 0 && <p className="mt-2 text-soft">{empty}</p>}
      <ul>
        {tokens.map(({ id, name, role, createdAt }) => (
          <li
            key={id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-line border-b py-3 last:border-b-0"
          >
            <p>
              <span className="font-bold [overflow-wrap:anywhere]">{name}</span>
              <span className="block text-[0.9375rem] text-soft">
                {role ? `as ${ROLE_NAMES[role]}, ` : ""}made{" "}
                <span className="figure">{formatMoment(createdAt)}</span>
              </span>
            </p>
            <Form method="post">
              <input type="hidden" name="token" value={id} />
              <button
                type="submit"
                name="intent"
                value="end-token"
                className="button"
                aria-label={`End the token ${name}`}
              >
                End
              </button>
            </Form>
          </li>
        ))}
      </ul>
    </section>
  );
}
