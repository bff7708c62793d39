import { Link } from "react-router";

interface PlaceLinkProps {
  folder: "bins" | "suppliers" | "purchase-orders" | "shop-orders" | "kit-orders";
  /** Bin code, supplier code or order number. */
  name: string;
  /** Said in its place. */
  says?: string;
}

/** A bin, supplier or order that leads to its page. */
export function PlaceLink({ folder, name, says }: PlaceLinkProps) {
  return (
    <Link
      to={`/find/${folder}/${encodeURIComponent(name)}`}
      className={`inline-block min-h-6 break-words underline ${says === undefined ? "figure" : ""}`}
    >
      {says ?? name}
    </Link>
  );
}
