import { Link } from "react-router";

/** Where the page is too narrow for the box: the way to the page Find. */
export function FindIconLink() {
  return (
    <Link
      to="/find"
      aria-label="Find by number or words"
      className="flex size-11 shrink-0 items-center justify-center md:hidden"
    >
      <svg viewBox="0 0 20 20" aria-hidden="true" className="size-5" fill="none">
        <path d="M8.5 2.5a6 6 0 1 1 0 12a6 6 0 0 1 0-12M13 13l5 5" stroke="currentColor" strokeWidth="2" />
      </svg>
    </Link>
  );
}
