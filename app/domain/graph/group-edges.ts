/** Edges by parent: those of a node stand in `edges` from `starts[node]` up to `starts[node + 1]`. */
export interface EdgesByParent {
  starts: Int32Array;
  /** Places in the input, which they keep in order within a parent. */
  edges: Int32Array;
}

/** Sorts edges by parent; `parents` names the parent of each. */
export function groupEdges(nodes: number, parents: Int32Array): EdgesByParent {
  const starts = new Int32Array(nodes + 1);
  for (let e = 0; e < parents.length; e++) starts[parents[e] + 1]++;
  for (let node = 0; node < nodes; node++) starts[node + 1] += starts[node];
  const next = starts.slice(0, nodes);
  const edges = new Int32Array(parents.length);
  for (let e = 0; e < parents.length; e++) edges[next[parents[e]]++] = e;
  return { starts, edges };
}
