import { Link } from "react-router";

/** A part number that leads to its page, with the description under it. */
export function PartLink({ partNumber, description }: { partNumber: string; description?: string }) {
  return (
    <>
      <Link
        to={`/find/parts/${encodeURIComponent(partNumber)}`}
        className="figure inline-block min-h-6 break-words font-semibold underline"
      >
        {partNumber}
      </Link>
      {description && <span className="block text-[0.9375rem] text-soft">{description}</span>}
    </>
  );
}
