export type StopReason =
  | "held-lot"
  | "expired-lot"
  | "overdue-order"
  | "drawn-down-by-s4"
  | "not-built-ahead"
  | "one-hand-short"
  | "plain-shortage";

export interface Stopper {
  partNumber: string;
  reason: StopReason;
  /** The first of ten S2 kits that it stops. */
  stopsAt: 8 | 9 | 10;
  /** Of what kit `stopsAt` lacks, the share that is there all the same. */
  nearly: number;
  /** Lines from the kit down to the part, the longest way. */
  depth: number;
}

/** What keeps kits 8 to 10 of the demo firm from being complete, and why. Every other part is there for ten. */
export const stoppers: readonly Stopper[] = [
  { partNumber: "HB-2041", reason: "held-lot", stopsAt: 8, nearly: 0, depth: 3 },
  { partNumber: "CL-1114", reason: "not-built-ahead", stopsAt: 8, nearly: 0.4, depth: 3 },
  { partNumber: "RU-2210R", reason: "one-hand-short", stopsAt: 8, nearly: 0, depth: 2 },
  { partNumber: "LD-2101", reason: "held-lot", stopsAt: 9, nearly: 0, depth: 3 },
  { partNumber: "CL-1121", reason: "not-built-ahead", stopsAt: 9, nearly: 0.7, depth: 3 },
  { partNumber: "AD-310", reason: "expired-lot", stopsAt: 9, nearly: 0.5, depth: 3 },
  { partNumber: "BT-3310", reason: "overdue-order", stopsAt: 9, nearly: 0, depth: 2 },
  { partNumber: "FA-2120", reason: "drawn-down-by-s4", stopsAt: 9, nearly: 0.5, depth: 2 },
  { partNumber: "CN-1312", reason: "plain-shortage", stopsAt: 9, nearly: 0.5, depth: 3 },
  { partNumber: "EN-6400", reason: "plain-shortage", stopsAt: 10, nearly: 0, depth: 2 },
  { partNumber: "SK-0010", reason: "drawn-down-by-s4", stopsAt: 10, nearly: 0.6, depth: 5 },
  { partNumber: "SK-0022", reason: "expired-lot", stopsAt: 10, nearly: 0.3, depth: 4 },
  { partNumber: "CB-0013", reason: "overdue-order", stopsAt: 10, nearly: 0.4, depth: 3 },
  { partNumber: "FU-1013", reason: "drawn-down-by-s4", stopsAt: 10, nearly: 0, depth: 2 },
  { partNumber: "FK-2X16-A2", reason: "plain-shortage", stopsAt: 10, nearly: 0.7, depth: 3 },
];
