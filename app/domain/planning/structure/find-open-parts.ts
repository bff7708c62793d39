import type { LineGroup } from "./structure";
import { PHANTOM } from "./structure";

/**
 * Where options and effectivity may stand: parts without parents, and phantoms used only under such
 * parts and such phantoms (PLANNING.md, section 2). Parts are numbered parents first.
 */
export function findOpenParts(sourcing: Uint8Array, groups: readonly LineGroup[]): Uint8Array {
  const open = new Uint8Array(sourcing.length).fill(1);
  for (const { component } of groups) {
    for (let k = 0; k < component.length; k++) if (sourcing[component[k]] !== PHANTOM) open[component[k]] = 0;
  }
  for (let p = 0; p < open.length; p++) {
    if (open[p] === 1) continue;
    for (const { starts, component } of groups) {
      for (let k = starts[p]; k < starts[p + 1]; k++) open[component[k]] = 0;
    }
  }
  return open;
}
