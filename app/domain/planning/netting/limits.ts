import type { Structure } from "../structure/structure";

/**
 * True where enough kits would run out of something: a leaf is reached from the kit through lines with a
 * quantity above 0 that count. Otherwise nothing limits how many can be built.
 */
export function isLimited(structure: Structure, kit: number, active: Uint8Array): boolean {
  const reached = new Uint8Array(structure.parts.length);
  reached[kit] = 1;
  for (let p = kit; p < reached.length; p++) {
    if (!reached[p]) continue;
    if (structure.leaf[p]) return true;
    const { fixed, conditional } = structure;
    for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
      if (fixed.num[k] > 0) reached[fixed.component[k]] = 1;
    }
    for (let k = conditional.starts[p]; k < conditional.starts[p + 1]; k++) {
      if (conditional.num[k] > 0 && active[k]) reached[conditional.component[k]] = 1;
    }
  }
  return false;
}
