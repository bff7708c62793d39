import type { DecimalString, IsoDate, PlanLine, PlanPart } from "../types";

/** Changes to try on a book. Nothing is stored. */
export interface WhatIf {
  /** More or less usable stock: a signed decimal in the part's unit. */
  stock: { partNumber: string; change: DecimalString }[];
  /** Lots taken out of use; null is every lot of the part. */
  hold: { partNumber: string; lot: string | null }[];
  /** New open orders, and dates of present ones moved. */
  supply: WhatIfSupply[];
  /** Parts as they would be, whole. A part that is not in the book is added. */
  parts: PlanPart[];
  /** Parents whose lines are replaced whole. */
  structure: { parent: string; lines: PlanLine[] }[];
}

export type WhatIfSupply =
  | { partNumber: string; quantity: DecimalString; due: IsoDate | null }
  | { reference: string; due: IsoDate | null };

/** What cannot be tried, by its place in the list it stands in. */
export type WhatIfProblem =
  | { code: "unknown-part"; list: "stock" | "hold" | "supply"; at: number; partNumber: string }
  | { code: "too-many-decimals"; list: "stock" | "supply"; at: number; decimals: number; quantity: string }
  | { code: "less-than-nothing"; list: "stock"; at: number; partNumber: string; available: DecimalString }
  | { code: "unknown-lot"; list: "hold"; at: number; partNumber: string; lot: string }
  | { code: "unknown-reference"; list: "supply"; at: number; reference: string };
