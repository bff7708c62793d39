/** How a part comes to be: bought, built here, or passed through (PLANNING.md, section 2). */
export type Sourcing = "buy" | "make" | "phantom";

/** `strict` keeps parts for an earlier order that waits; `release` lets a later complete one go. */
export type Sharing = "strict" | "release";

/** ISO 8601 calendar date, `YYYY-MM-DD`. */
export type IsoDate = string;

/** Decimal digits with an optional point, never a float: `"12"`, `"0.350"`. */
export type DecimalString = string;

/** One part as the planning core takes it. */
export interface PlanPart {
  /** As it is shown; two parts are the same when their `partKey` is. */
  partNumber: string;
  sourcing: Sourcing;
  /** UN/CEFACT Recommendation 20 code. */
  unit: string;
  /** 0 to 6; one step of the part is 10^-decimals of its unit. */
  decimals: number;
  leadTimeDays: number;
  /** Above 0 and at most 1. */
  yield: DecimalString;
  /** Per unit, in the shop's currency. */
  unitCost: DecimalString | null;
  /** Per unit. A make part's own mass, where given, stands in for its components'. */
  massKg: DecimalString | null;
}

/** One line of a structure: one unit of `parent` takes `quantity` of `component`. */
export interface PlanLine {
  parent: string;
  component: string;
  /** In the component's unit; null is "as required". */
  quantity: DecimalString | null;
  /** 0 to below 1. */
  scrap: DecimalString;
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
  fromDate: IsoDate | null;
  toDate: IsoDate | null;
}

/**
 * Usable stock of one part, one row a lot. Held stock and stock staged for an order never come here.
 * `nowOnly` marks components promised to or picked into an unfinished build: usable in the pass *now*,
 * left to the build in the pass *coming* (PLANNING.md, section 4).
 */
export interface PlanStock {
  partNumber: string;
  quantity: DecimalString;
  expiresOn: IsoDate | null;
  /** Only told apart where a what-if holds one lot. */
  lot?: string | null;
  nowOnly?: boolean;
}

/** An open order: a purchase order line, or the good output still to come from a build under way. */
export interface PlanSupply {
  partNumber: string;
  quantity: DecimalString;
  due: IsoDate | null;
  reference: string | null;
}

/** Whole kits asked for. Demands are served in the order given. */
export interface PlanDemand {
  partNumber: string;
  /** A whole number above 0. */
  quantity: DecimalString;
  due: IsoDate | null;
  options: readonly string[];
  /** Serial of the first kit; the others follow it. */
  serial: string | null;
}

/** What a structure cannot be planned with; `line` is an index into the lines given. */
export type StructureProblem =
  | { code: "loop"; line: number; loop: string[] }
  | { code: "unknown-part"; line: number; column: "parent" | "component"; partNumber: string }
  | { code: "duplicate-part"; part: number; partNumber: string }
  | {
      code: "condition-not-allowed";
      line: number;
      column: "option" | "from_serial" | "to_serial" | "from_date" | "to_date";
      parent: string;
    };

/** What a demand cannot be planned with; `demand` is an index into the demands given. */
export type DemandProblem =
  | { code: "unknown-part"; demand: number; partNumber: string }
  | { code: "unknown-option"; demand: number; partNumber: string; option: string; offered: string[] }
  | { code: "bad-serial"; demand: number; serial: string };

export type WarningCode =
  | "as-required-none-on-hand"
  | "make-without-structure"
  | "overdue-supply"
  | "supply-without-date";

/** The answer to "can these kits ship?", as command line and HTTP give it (DESIGN.md, contracts). */
export interface ShipCheck {
  today: IsoDate;
  demand: {
    partNumber: string;
    quantity: DecimalString;
    due: IsoDate | null;
    options: string[];
    serial: string | null;
    buildable: number | null;
    earliest: IsoDate;
  }[];
  buildable: Record<string, number | null>;
  earliest: Record<string, IsoDate>;
  ladder: Rung[];
  shortages: Shortage[];
  builds: {
    partNumber: string;
    unit: string;
    gross: DecimalString;
    fromStock: DecimalString;
    onOrder: DecimalString;
    build: DecimalString;
  }[];
  criticalChain: ChainLink[];
  /** Only with `release`. Demand numbers from 1. */
  debts?: Debt[];
  warnings: { code: WarningCode; partNumber: string }[];
}

export interface Rung {
  partNumber: string;
  /** Kits so far, this one included, in the order of service. */
  kits: number;
  /** Two decimals; null for people who may not see costs. */
  cost: DecimalString | null;
  readyOn: IsoDate;
  stoppers: { partNumber: string; missing: DecimalString }[];
}

export interface Shortage {
  partNumber: string;
  unit: string;
  gross: DecimalString;
  fromStock: DecimalString;
  onOrder: DecimalString;
  short: DecimalString;
  missing: DecimalString;
  /** Number of the first kit, in the order of service, that the part stops. */
  stopsAt: number;
  needBy: IsoDate | null;
  orderBy: IsoDate | null;
  readyOn: IsoDate;
}

export interface ChainLink {
  partNumber: string;
  why: "build" | "buy" | "on-order" | "stock";
  readyOn: IsoDate;
}

/** `from` has taken what `to` was promised. */
export interface Debt {
  partNumber: string;
  quantity: DecimalString;
  from: number;
  to: number;
}
