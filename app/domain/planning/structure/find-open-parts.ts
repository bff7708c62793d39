import { PHANTOM } from "./structure";

/**
 * Where options and effectivity may stand: parts without parents, and phantoms used only under such
 * parts and such phantoms (PLANNING.md, section 2). Parts are numbered parents first.
 */
export function findOpenParts(
  parts: number,
  sourcing: Uint8Array,
  parent: Int32Array,
  component: Int32Array,
): Uint8Array {
  const open = new Uint8Array(parts).fill(1);
  const hasParent = new Uint8Array(parts);
  const byParent = groupEdges(parts, parent);
  for (let e = 0; e < component.length; e++) hasParent[component[e]] = 1;
  for (let p = 0; p < parts; p++) {
    if (hasParent[p] && sourcing[p] !== PHANTOM) open[p] = 0;
    if (open[p]) continue;
    for (let k = byParent.starts[p]; k < byParent.starts[p + 1]; k++) open[component[byParent.edges[k]]] = 0;
  }
  return open;
}

function groupEdges(parts: number, parent: Int32Array): { starts: Int32Array; edges: Int32Array } {
  const starts = new Int32Array(parts + 1);
  for (let e = 0; e < parent.length; e++) starts[parent[e] + 1]++;
  for (let p = 0; p < parts; p++) starts[p + 1] += starts[p];
  const next = starts.slice(0, parts);
  const edges = new Int32Array(parent.length);
  for (let e = 0; e < parent.length; e++) edges[next[parent[e]]++] = e;
  return { starts, edges };
}
