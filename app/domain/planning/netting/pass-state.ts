import type { Steps } from "../../quantity/steps";
import type { Structure } from "../structure/structure";

/** Whole steps by part (or line) number, in one of two exact forms. */
export interface Amounts {
  readonly length: number;
  [index: number]: Steps;
}

/**
 * One pass over the structure, for all kits served so far. `net` is gross - fromStock - onOrder; for a
 * leaf it is short, for the others it goes on to their lines as `start`.
 */
export interface PassState {
  gross: Amounts;
  fromStock: Amounts;
  onOrder: Amounts;
  net: Amounts;
  /** What a make part starts (net / yield, rounded up) or a phantom passes through; 0 for leaves. */
  start: Amounts;
  /** By conditional line: the parent's start over the kits for which the line counts. */
  throughLine: Amounts;
  /** Asked for directly, cumulative, by part number. */
  asked: Map<number, Steps>;
}

/** What a pass adds to the kits already served. */
export interface PassInput {
  part: number;
  /** Whole steps of the kit part. */
  quantity: Steps;
  /** What these kits may still take from stock. */
  stock: Amounts;
  /** What they may still take from open orders; null in the pass *now*. */
  supply: Amounts | null;
  /** 1 for each conditional line that counts for these kits. */
  active: Uint8Array;
  base: PassState;
}

/** Exact doubles, or BigInt where doubles would not do. */
export interface Engine {
  zeros(length: number): Amounts;
  from(value: Steps): Steps;
  copy(amounts: Amounts): Amounts;
  /** `from - less`, part by part. */
  subtract(from: Amounts, less: Amounts): Amounts;
  /** Parts of the mask for which `after` is more than `before`, in order. */
  grown(mask: Uint8Array, after: Amounts, before: Amounts): number[];
  /** False when a number left the range in which doubles are exact; the result is then void. */
  run(structure: Structure, input: PassInput, out: PassState): boolean;
}

/** A state in which nothing has been asked for. */
export function emptyState(structure: Structure, engine: Engine): PassState {
  const parts = structure.parts.length;
  return {
    gross: engine.zeros(parts),
    fromStock: engine.zeros(parts),
    onOrder: engine.zeros(parts),
    net: engine.zeros(parts),
    start: engine.zeros(parts),
    throughLine: engine.zeros(structure.conditional.component.length),
    asked: new Map(),
  };
}

/** The same figures in arrays of their own: a lane writes over its own ones. */
export function copyState(state: PassState, engine: Engine): PassState {
  const { copy } = engine;
  return {
    gross: copy(state.gross),
    fromStock: copy(state.fromStock),
    onOrder: copy(state.onOrder),
    net: copy(state.net),
    start: copy(state.start),
    throughLine: copy(state.throughLine),
    asked: new Map(state.asked),
  };
}
