import { useRef } from "react";
import { Form, Link } from "react-router";
import { useCloseDetails } from "~/hooks/use-close-details";
import { ThemeChoice } from "./theme-choice";

export interface NameMenuProps {
  person: { name: string; roles: readonly string[]; may: readonly string[] };
}

/** Pages behind the name; each stands here for those who may do its act. */
const PLACES = [
  { act: "own-account", word: "Your account", to: "/account" },
  { act: "people", word: "People", to: "/admin/people" },
  { act: "settings", word: "Mail", to: "/admin/mail" },
  { act: "audit", word: "Audit", to: "/admin/audit" },
] as const;

/** Behind the person's name: who is signed in, light or dark, the way out. */
export function NameMenu({ person }: NameMenuProps) {
  const menu = useRef<HTMLDetailsElement>(null);
  useCloseDetails(menu);
  const places = PLACES.filter(({ act }) => person.may.includes(act));
  const [firstName] = person.name.split(" ");
  return (
    <details ref={menu} className="group relative shrink-0">
      <summary className="flex min-h-11 items-center gap-2 px-1">
        <span className="max-w-28 truncate sm:max-w-none">
          <span className="sm:hidden">{firstName}</span>
          <span className="hidden sm:inline">{person.name}</span>
        </span>
        <svg viewBox="0 0 10 6" aria-hidden="true" className="h-1.5 w-2.5 group-open:rotate-180" fill="none">
          <path d="M1 1l4 4 4-4" stroke="currentColor" strokeWidth="1.5" />
        </svg>
      </summary>
      <div className="absolute right-0 top-full z-30 w-64 border border-edge bg-sheet p-4">
        <p className="font-bold">{person.name}</p>
        <p className="text-soft">{person.roles.join(", ")}</p>
        {places.length > 0 && (
          <ul className="mt-3 border-line border-t pt-1">
            {places.map(({ word, to }) => (
              <li key={to}>
                <Link to={to} className="flex min-h-11 items-center underline">
                  {word}
                </Link>
              </li>
            ))}
          </ul>
        )}
        <ThemeChoice />
        {/* A whole new page, so that nothing this person has seen stays behind in the browser's memory. */}
        <Form method="post" action="/sign-out" reloadDocument>
          <button type="submit" className="button mt-4 w-full">
            Sign out
          </button>
        </Form>
      </div>
    </details>
  );
}
