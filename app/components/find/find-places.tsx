import { NavLink } from "react-router";

const PLACES = [
  { word: "Search", to: "/find" },
  { word: "Files", to: "/find/files" },
] as const;

/** The thin line under the verbs: the places of Find. A place stands in it once it has a page. */
export function FindPlaces() {
  return (
    <nav aria-label="Places of Find" className="-mx-2 mb-5 overflow-x-auto border-line border-b print:hidden">
      <ul className="flex">
        {PLACES.map((place) => (
          <li key={place.to}>
            <NavLink
              end
              to={place.to}
              className={({ isActive }) =>
                `-outline-offset-4 flex min-h-11 items-center px-2 ${
                  isActive ? "font-bold no-underline" : "text-soft underline hover:text-ink"
                }`
              }
            >
              {place.word}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
