import type { DecimalString, Sourcing } from "~/domain/planning/types";

/** A part as JSON routes give it: quantities with the part's decimals, cost null where it may not be seen. */
export interface PresentedPart {
  partNumber: string;
  description: string;
  sourcing: Sourcing;
  unit: string;
  decimals: number;
  leadTimeDays: number;
  safetyStock: DecimalString;
  lotRule: string;
  lotMinimum: DecimalString | null;
  lotMultiple: DecimalString | null;
  lotMaximum: DecimalString | null;
  lotDays: number | null;
  yield: DecimalString;
  unitCost: DecimalString | null;
  massKg: DecimalString | null;
  sold: boolean;
}

/** What keeps a balance from use; `usable` where nothing does. */
export type Standing = "usable" | "held" | "expired" | "staged" | "with-supplier";

/** One part's stock in sums that add up: on hand is usable + held + expired + staged, available is usable - promised. */
export interface PartTotals {
  onHand: string;
  usable: string;
  held: string;
  expired: string;
  staged: string;
  /** Ours, but not here: not part of what is on hand. */
  withSupplier: string;
  promised: string;
  /** Below zero where more is promised than is usable. */
  available: string;
  onOrder: string;
}

/** A line that takes the part, with its parent. */
export interface WhereUsedLine {
  partNumber: string;
  description: string;
  findNumber: string | null;
  /** For one of the parent; null as required. */
  quantity: string | null;
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
}

export interface PartBalance {
  bin: string;
  lot: string | null;
  state: string;
  quantity: string;
  expiresOn: string | null;
  /** `state`, but `expired` where the lot is past its day. */
  standing: Standing;
}

export interface OpenOrder {
  kind: "purchase-order" | "shop-order";
  reference: string;
  quantity: string;
  due: string | null;
  supplier: string | null;
  /** Due before today. */
  isOverdue: boolean;
}

export interface PartAnswer extends PresentedPart {
  totals: PartTotals;
  balances: PartBalance[];
  /** Promised to builds under way. */
  promised: { reference: string; quantity: string }[];
  onOrder: OpenOrder[];
  whereUsed: WhereUsedLine[];
}
