import type { Structure } from "./structure/structure";

/** How many different parts stand in the part's structure, itself left out, whatever the options. */
export function countReached(structure: Structure, part: number): number {
  const reached = new Uint8Array(structure.parts.length);
  reached[part] = 1;
  let count = -1;
  for (let p = part; p < reached.length; p++) {
    if (!reached[p]) continue;
    count++;
    for (const { starts, component } of [structure.fixed, structure.conditional, structure.asRequired]) {
      for (let k = starts[p]; k < starts[p + 1]; k++) reached[component[k]] = 1;
    }
  }
  return count;
}
