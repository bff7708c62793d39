import { splitPromised } from "~/domain/planning/split-promised";
import type { DecimalString, PlanStock } from "~/domain/planning/types";

/** Stock as it lies there, before what builds under way have a claim on is told apart. */
export interface ShelfRows {
  /** Usable stock, one row a lot. */
  usable: PlanStock[];
  /** Components of unfinished builds that still lie in their bins. */
  promised: { partNumber: string; quantity: DecimalString }[];
  /** Components of unfinished builds that lie at the bench. */
  picked: { partNumber: string; quantity: DecimalString }[];
}

/** The rows of stock that a plan is laid out from. */
export function layOutStock({ usable, promised, picked }: ShelfRows): PlanStock[] {
  const atBench = picked.map((row) => ({ ...row, expiresOn: null, nowOnly: true }));
  return [...splitPromised(usable, promised), ...atBench];
}
