import type { BalanceState, Place, PostedKind } from "./types";

/** What a kind of movement looks like. */
export interface KindRule {
  /** The bins that it names. */
  sides: "from" | "to" | "both" | "either";
  /** Where the other side is, outside of the bins; null where both sides are bins. */
  outside: Place | null;
  /** States that it may take from and bring to; empty is all. */
  fromStates: readonly BalanceState[];
  toStates: readonly BalanceState[];
  needsReason: boolean;
}

const IN: Omit<KindRule, "outside"> = {
  sides: "to",
  fromStates: [],
  toStates: ["usable", "held"],
  needsReason: false,
};

/** The rules of every kind that people post. Held stock leaves its hold by release, scrap or adjustment only. */
export const KIND_RULES: Readonly<Record<PostedKind, KindRule>> = {
  receive: { ...IN, outside: "supplier" },
  return: { ...IN, outside: "in-work" },
  issue: {
    sides: "from",
    outside: "in-work",
    fromStates: ["usable", "staged"],
    toStates: [],
    needsReason: false,
  },
  scrap: { sides: "from", outside: "scrap", fromStates: [], toStates: [], needsReason: false },
  move: { sides: "both", outside: null, fromStates: [], toStates: [], needsReason: false },
  hold: {
    sides: "both",
    outside: null,
    fromStates: ["usable", "staged"],
    toStates: ["held"],
    needsReason: false,
  },
  release: { sides: "both", outside: null, fromStates: ["held"], toStates: ["usable"], needsReason: false },
  adjust: { sides: "either", outside: "adjustment", fromStates: [], toStates: [], needsReason: true },
};
