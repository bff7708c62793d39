import type { Steps } from "../../quantity/steps";
import type { PlanLine, PlanPart } from "../types";
import type { PartNumbers } from "./part-numbers";

export const BUY = 0;
export const MAKE = 1;
export const PHANTOM = 2;

/** A whole ratio: component steps for each parent step, scrap included; need = ceil(parent steps x num / den). */
export interface Ratio {
  num: bigint;
  den: bigint;
}

/** Lines grouped by parent: those of part `p` stand at `starts[p]` up to `starts[p + 1]`. */
export interface LineGroup {
  starts: Int32Array;
  component: Int32Array;
  /** Index of the line in the input. */
  source: Int32Array;
}

export interface QuantityLines extends LineGroup {
  num: Float64Array;
  den: Float64Array;
  /** Ratios whose terms pass 2^53, by position; the arrays hold infinity there. */
  wide: Map<number, Ratio>;
}

/**
 * A structure compiled for planning. Parts are numbered in low-level-code order: a parent always has a
 * smaller number than its components. Immutable, and shared by every plan of the same revision.
 */
export interface Structure {
  parts: readonly PlanPart[];
  /** Part number key to number. */
  numberOf: PartNumbers;
  level: Int32Array;
  sourcing: Uint8Array;
  decimals: Uint8Array;
  leadTime: Int32Array;
  /** A make part starts ceil(net x num / den); 1 and 1 for the others. */
  yieldNum: Float64Array;
  yieldDen: Float64Array;
  wideYield: Map<number, Ratio>;
  /** 1 where net need is a shortage of the part itself: bought, or nothing to make it from. */
  leaf: Uint8Array;
  /** 1 where options and effectivity may stand: kits, and phantoms used only under them. */
  open: Uint8Array;
  /** Numbers of the open parts that have conditional lines below or beside them, in order. */
  openParts: Int32Array;
  /** Lines that always count. */
  fixed: QuantityLines;
  /** Lines with an option or an effectivity. */
  conditional: QuantityLines;
  /** Lines without quantity, conditional or not. */
  asRequired: LineGroup;
  lines: readonly PlanLine[];
}

/** Whole steps of a count of kits. */
export function kitSteps(structure: Structure, part: number, kits: Steps): Steps {
  const decimals = structure.decimals[part];
  if (decimals === 0) return kits;
  return BigInt(kits) * 10n ** BigInt(decimals);
}

/** True where the line counts only for some demands. */
export function isConditional(line: PlanLine): boolean {
  return (
    line.option !== null ||
    line.fromSerial !== null ||
    line.toSerial !== null ||
    line.fromDate !== null ||
    line.toDate !== null
  );
}
