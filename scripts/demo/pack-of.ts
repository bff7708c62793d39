import type { BookPart } from "./book";

export interface Pack {
  /** UN/CEFACT code: Recommendation 20 for a measure, 21 with X before for a packaging. */
  unit: string;
  /** How many of the part's own unit one holds. */
  per: number;
  /** Smallest number of packs that makes sense to order together. */
  multiple: number;
}

const METRES: Record<string, [string, number]> = {
  wire: ["XRL", 100],
  cable: ["XRL", 50],
  hose: ["XRO", 20],
  webb: ["XRO", 50],
  rubber: ["XRO", 25],
  trim: ["XRO", 25],
  term: ["XSO", 30.48],
  adhes: ["XRO", 15],
  pack: ["XRO", 100],
  exhaust: ["XRO", 10],
  elec: ["XRO", 25],
  fabric: ["XRO", 15],
};
const SQUARES: Record<string, [string, number]> = {
  fabric: ["XRO", 63.5],
  skirtcl: ["XRO", 75],
  trim: ["XRO", 42],
  foam: ["XST", 2.88],
  wood: ["XST", 3.125],
  crate: ["XST", 2.977],
  pack: ["XST", 2],
};
const KILOS: Record<string, [string, number]> = {
  resin: ["XDR", 25],
  adhes: ["XBX", 4],
  trim: ["XSO", 0.5],
  paint: ["XBX", 20],
};
const PIECES: Record<string, [string, number]> = {
  term: ["XPK", 100],
  conn: ["XPK", 25],
  decal: ["XPK", 10],
  pack: ["XPK", 50],
};

/** How the part is bought: box, roll, reel, sheet, drum, or by its own unit. */
export function packOf(part: BookPart): Pack {
  const trade = part.trade ?? "";
  if (part.partNumber === "RS-120") return { unit: "XCX", per: 5, multiple: 1 };
  if (part.partNumber.startsWith("GC-")) return { unit: "XPL", per: 20, multiple: 1 };
  if (part.unit === "MTR") {
    if (trade === "tube" || trade === "crate")
      return { unit: "MTR", per: 1, multiple: trade === "tube" ? 6 : 3 };
    if (part.description.startsWith("Cable, battery")) return { unit: "XRL", per: 25, multiple: 1 };
    return packed(METRES[trade]);
  }
  if (part.unit === "MTK") return packed(SQUARES[trade]);
  if (part.unit === "KGM") return packed(KILOS[trade]);
  if (part.unit === "LTR") return { unit: "XCI", per: 20, multiple: 1 };
  if (part.unit === "MTQ") return { unit: "MTQ", per: 1, multiple: 0.5 };
  if (trade === "fast" && (part.cost ?? 0) < 1) return { unit: "XBX", per: boxOf(part), multiple: 1 };
  if ((trade === "trim" || trade === "hardware" || trade === "webb") && (part.cost ?? 0) < 0.5)
    return { unit: "XPK", per: 250, multiple: 1 };
  if (PIECES[trade] && (part.cost ?? 0) < 2) return packed(PIECES[trade]);
  return { unit: "EA", per: 1, multiple: 1 };
}

function boxOf(part: BookPart): number {
  if (/^F[WXQR]/.test(part.partNumber)) return (part.mass ?? 0) > 0.006 ? 100 : 250;
  if ((part.mass ?? 0) > 0.04) return 25;
  return (part.mass ?? 0) > 0.012 ? 50 : 100;
}

function packed(found: [string, number] | undefined): Pack {
  return found ? { unit: found[0], per: found[1], multiple: 1 } : { unit: "EA", per: 1, multiple: 1 };
}
