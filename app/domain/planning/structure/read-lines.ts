import { partKey } from "../part-key";
import type { PlanLine, PlanPart, StructureProblem } from "../types";
import type { PartIndex } from "./part-index";
import { isConditional } from "./structure";

/** Bits of a line's kind. */
export const FIXED = 0;
export const CONDITIONAL = 1;
export const AS_REQUIRED = 2;

/** Lines in input order as numbers; parts by their place in the input until they are numbered. */
export interface ReadLines {
  parent: Int32Array;
  component: Int32Array;
  kind: Uint8Array;
  /** Pieces for each parent where that is a small whole number without scrap, else -1. */
  pieces: Int32Array;
}

/** Most problems that are told at once. */
export const MOST_PROBLEMS = 100;

/** Looks at each line once, since there may be millions of them. Adds lines of unknown parts to the problems. */
export function readLines(
  parts: readonly PlanPart[],
  lines: readonly PlanLine[],
  given: PartIndex,
  problems: StructureProblem[],
): ReadLines {
  const parent = new Int32Array(lines.length);
  const component = new Int32Array(lines.length);
  const kind = new Uint8Array(lines.length);
  const pieces = new Int32Array(lines.length);
  const isPieces = new Uint8Array(parts.length);
  for (let at = 0; at < parts.length; at++) isPieces[at] = parts[at].decimals === 0 ? 1 : 0;
  const find = (text: string, line: number, column: "parent" | "component") => {
    let at = given.find(text);
    if (at < 0) at = given.find(partKey(text));
    if (at >= 0) return at;
    problems.push({ code: "unknown-part", line, column, partNumber: text });
    return 0;
  };
  let last = "";
  let lastAt = -1;
  for (let line = 0; line < lines.length && problems.length < MOST_PROBLEMS; line++) {
    const one = lines[line];
    // Lines mostly come parent by parent.
    if (lastAt < 0 || one.parent !== last) {
      last = one.parent;
      lastAt = find(last, line, "parent");
    }
    const componentAt = find(one.component, line, "component");
    parent[line] = lastAt;
    component[line] = componentAt;
    kind[line] = (one.quantity === null ? AS_REQUIRED : 0) | (isConditional(one) ? CONDITIONAL : 0);
    const isWhole = isPieces[lastAt] === 1 && isPieces[componentAt] === 1 && one.scrap === "0";
    pieces[line] = isWhole && one.quantity !== null ? fewDigits(one.quantity) : -1;
  }
  return { parent, component, kind, pieces };
}

/** Up to six plain digits as a number, else -1. */
function fewDigits(text: string): number {
  if (text.length === 0 || text.length > 6) return -1;
  let value = 0;
  for (let i = 0; i < text.length; i++) {
    const digit = text.charCodeAt(i) - 48;
    if (digit < 0 || digit > 9) return -1;
    value = value * 10 + digit;
  }
  return value;
}
