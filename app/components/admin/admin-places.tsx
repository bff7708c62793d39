import { NavLink } from "react-router";

const PLACES = [
  { word: "People", to: "/admin/people" },
  { word: "Mail", to: "/admin/mail" },
  { word: "Audit", to: "/admin/audit" },
] as const;

/** The thin line that leads from one of the manager's pages to the next. */
export function AdminPlaces() {
  return (
    <nav aria-label="Managing" className="mb-6 flex flex-wrap gap-x-6 border-line border-b print:hidden">
      {PLACES.map(({ word, to }) => (
        <NavLink
          key={to}
          to={to}
          className="-mb-px inline-flex min-h-11 items-center border-transparent border-b-2 aria-[current=page]:border-ink aria-[current=page]:font-bold"
        >
          {word}
        </NavLink>
      ))}
    </nav>
  );
}
