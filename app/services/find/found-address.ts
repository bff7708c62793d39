import type { FoundKind } from "~/schemas/find/find-answer";

const FOLDERS: Record<FoundKind, string> = {
  part: "/find/parts/",
  bin: "/find/bins/",
  lot: "/find/parts/",
  supplier: "/find/suppliers/",
  "purchase-order": "/find/purchase-orders/",
  "shop-order": "/find/shop-orders/",
  "kit-order": "/find/kit-orders/",
};

/** The page of a thing. A lot is a place on the page of its part. */
export function foundAddress(kind: FoundKind, name: string, part: string | null): string {
  if (kind === "lot")
    return `${FOLDERS.lot}${encodeURIComponent(part ?? "")}#lot-${encodeURIComponent(name)}`;
  return FOLDERS[kind] + encodeURIComponent(name);
}
