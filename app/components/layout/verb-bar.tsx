import { NavLink } from "react-router";
import { VERBS } from "./verbs";

/** The top bar: what people come to do. */
export function VerbBar() {
  return (
    <nav aria-label="What to do" className="-mx-1 flex-1 overflow-x-auto">
      <ul className="flex gap-1 sm:gap-3">
        {VERBS.map((verb) => (
          <li key={verb.to}>
            <NavLink
              to={verb.to}
              className={({ isActive }) =>
                `-outline-offset-4 flex h-14 items-center border-b-[3px] px-2 pt-[3px] text-lg no-underline ${
                  isActive ? "border-ink font-bold" : "border-transparent text-soft hover:text-ink"
                }`
              }
            >
              {verb.word}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
