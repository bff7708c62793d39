import type { Decimal } from "../quantity/parse-decimal";
import { requireDecimal } from "../quantity/parse-decimal";
import { requireSteps } from "../quantity/parse-steps";
import { partKey } from "./part-key";
import type { Structure } from "./structure/structure";
import type { DecimalString, PlanLine } from "./types";

export interface MassRollUp {
  /** Kilograms of one unit, exact. */
  massKg: DecimalString;
  /** Part numbers that weigh nothing here because nobody has said what they weigh, sorted. */
  unknown: string[];
}

/**
 * What one unit of the part weighs: its own mass where given, else the sum of quantity x mass over the
 * lines that count. Scrap and yield are losses that stay in the shop; as-required lines are left out.
 * Null where there is no such part.
 */
export function rollUpMass(
  structure: Structure,
  partNumber: string,
  counts: (line: PlanLine) => boolean,
): MassRollUp | null {
  const top = structure.numberOf.get(partKey(partNumber));
  if (top === undefined) return null;
  const masses: Decimal[] = new Array(structure.parts.length);
  const reached = markReached(structure, top, counts);
  const unknown: string[] = [];
  for (let p = reached.length - 1; p >= top; p--) {
    if (!reached[p]) continue;
    const { massKg } = structure.parts[p];
    if (massKg !== null) masses[p] = requireDecimal(massKg);
    else masses[p] = sumComponents(structure, p, masses, counts);
    if (massKg === null && structure.leaf[p]) unknown.push(structure.parts[p].partNumber);
  }
  return { massKg: writeDecimal(masses[top]), unknown: unknown.sort() };
}

/** Lines are followed only below parts whose own mass is not given. */
function markReached(structure: Structure, top: number, counts: (line: PlanLine) => boolean): Uint8Array {
  const reached = new Uint8Array(structure.parts.length);
  reached[top] = 1;
  for (let p = top; p < reached.length; p++) {
    if (!reached[p] || structure.leaf[p] || structure.parts[p].massKg !== null) continue;
    for (const { component } of countedLines(structure, p, counts)) reached[component] = 1;
  }
  return reached;
}

function sumComponents(
  structure: Structure,
  p: number,
  masses: Decimal[],
  counts: (line: PlanLine) => boolean,
): Decimal {
  let sum: Decimal = { digits: 0n, scale: 0 };
  if (structure.leaf[p]) return sum;
  for (const { component, line } of countedLines(structure, p, counts)) {
    const decimals = structure.decimals[component];
    const steps = BigInt(requireSteps(line.quantity ?? "0", decimals));
    const { digits, scale } = masses[component];
    sum = add(sum, { digits: steps * digits, scale: decimals + scale });
  }
  return sum;
}

function countedLines(structure: Structure, p: number, counts: (line: PlanLine) => boolean) {
  const found: { component: number; line: PlanLine }[] = [];
  for (const { starts, component, source } of [structure.fixed, structure.conditional]) {
    for (let k = starts[p]; k < starts[p + 1]; k++) {
      const line = structure.lines[source[k]];
      if (counts(line)) found.push({ component: component[k], line });
    }
  }
  return found;
}

function add(a: Decimal, b: Decimal): Decimal {
  const scale = Math.max(a.scale, b.scale);
  const digits = a.digits * 10n ** BigInt(scale - a.scale) + b.digits * 10n ** BigInt(scale - b.scale);
  return { digits, scale };
}

function writeDecimal({ digits, scale }: Decimal): DecimalString {
  const text = digits.toString().padStart(scale + 1, "0");
  if (scale === 0) return text;
  return `${text.slice(0, -scale)}.${text.slice(-scale)}`.replace(/\.?0+$/, "");
}
