import type { DecimalString, IsoDate } from "~/domain/planning/types";

/** The open kit orders in priority order, as `GET /api/ship-line` gives them. */
export interface ShipLineAnswer {
  ready: number;
  of: number;
  /** The first order that cannot ship, and what it waits for; null when all can. */
  next: {
    kitOrder: string;
    partNumber: string;
    stoppers: { partNumber: string; missing: DecimalString }[];
  } | null;
  /** When the last of them can ship; null without orders. */
  allBy: IsoDate | null;
  revision: string | number;
}
