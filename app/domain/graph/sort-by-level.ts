import { groupEdges } from "./group-edges";

/** Edges from parent to component as two arrays of node numbers, one entry an edge. */
export interface Edges {
  nodes: number;
  parents: Int32Array;
  components: Int32Array;
}

export type LevelOrder =
  | { ok: true; order: Int32Array; levels: Int32Array }
  | { ok: false; loop: number[]; edge: number };

/**
 * Puts every parent before its components, by low-level code: `levels[node]` is the longest way down to
 * the node from a node without parents, and `order` lists the nodes level by level. Where the edges run
 * in a circle the answer is one loop, whole and in order (first node not repeated), and the last of its
 * edges as they were given. Kahn's algorithm; no recursion, whatever the depth.
 */
export function sortByLevel(
  { nodes, parents, components }: Edges,
  { starts, edges } = groupEdges(nodes, parents),
): LevelOrder {
  const waiting = new Int32Array(nodes);
  for (let e = 0; e < components.length; e++) waiting[components[e]]++;
  const order = new Int32Array(nodes);
  const levels = new Int32Array(nodes);
  let filled = 0;
  for (let node = 0; node < nodes; node++) if (waiting[node] === 0) order[filled++] = node;
  for (let next = 0; next < filled; next++) {
    const node = order[next];
    const below = levels[node] + 1;
    for (let k = starts[node]; k < starts[node + 1]; k++) {
      const target = components[edges[k]];
      if (levels[target] < below) levels[target] = below;
      if (--waiting[target] === 0) order[filled++] = target;
    }
  }
  if (filled < nodes) return { ok: false, ...findLoop(parents, components, waiting) };
  return { ok: true, order, levels };
}

/** Each node still waiting has a parent still waiting, so going up from any of them runs into a loop. */
function findLoop(parents: Int32Array, components: Int32Array, waiting: Int32Array) {
  const upEdge = new Int32Array(waiting.length).fill(-1);
  let start = -1;
  for (let e = 0; e < parents.length; e++) {
    if (waiting[parents[e]] === 0 || waiting[components[e]] === 0) continue;
    upEdge[components[e]] = e;
    if (start < 0) start = components[e];
  }
  const seen = new Uint8Array(waiting.length);
  while (!seen[start]) {
    seen[start] = 1;
    start = parents[upEdge[start]];
  }
  const loop: number[] = [];
  let edge = -1;
  for (let node = start; loop.length === 0 || node !== start; node = parents[upEdge[node]]) {
    loop.push(node);
    edge = Math.max(edge, upEdge[node]);
  }
  return { loop: loop.reverse(), edge };
}
