import { describe, expect, test } from "vitest";
import { groupEdges } from "~/domain/graph/group-edges";
import { sortByLevel } from "~/domain/graph/sort-by-level";

const sort = (nodes: number, edges: [parent: number, component: number][]) =>
  sortByLevel({
    nodes,
    parents: Int32Array.from(edges, ([parent]) => parent),
    components: Int32Array.from(edges, ([, component]) => component),
  });

describe("sortByLevel", () => {
  test("puts a node below the longest way down to it", () => {
    const sorted = sort(5, [
      [0, 3],
      [0, 1],
      [1, 2],
      [2, 3],
    ]);
    expect(sorted).toEqual({
      ok: true,
      order: Int32Array.of(0, 4, 1, 2, 3),
      levels: Int32Array.of(0, 1, 2, 3, 0),
    });
  });

  test("takes the same edge twice", () => {
    expect(
      sort(2, [
        [1, 0],
        [1, 0],
      ]),
    ).toMatchObject({ ok: true, order: Int32Array.of(1, 0) });
  });

  test("takes nothing at all", () => {
    expect(sort(0, [])).toMatchObject({ ok: true });
  });

  test("goes down a hundred thousand levels", () => {
    const depth = 100_000;
    const sorted = sort(
      depth,
      Array.from({ length: depth - 1 }, (_, at) => [at + 1, at]),
    );
    expect(sorted.ok && sorted.levels[0]).toBe(depth - 1);
    expect(sorted.ok && sorted.order[0]).toBe(depth - 1);
  });

  test("every parent comes before its components, whatever the order of the edges", () => {
    const edges: [number, number][] = [];
    for (let at = 1; at < 300; at++) edges.push([(at * 7919) % at, at], [(at * 104729) % at, at]);
    const sorted = sort(300, edges.reverse());
    if (!sorted.ok) throw new Error("There is no loop.");
    const place = new Map([...sorted.order].map((node, at) => [node, at]));
    for (const [parent, component] of edges) {
      expect(place.get(parent)).toBeLessThan(place.get(component) as number);
      expect(sorted.levels[parent]).toBeLessThan(sorted.levels[component]);
    }
  });
});

describe("a loop", () => {
  test("is told whole, from parent to component, with its last edge", () => {
    const sorted = sort(6, [
      [0, 1],
      [1, 2],
      [3, 1],
      [2, 3],
      [2, 4],
      [4, 5],
    ]);
    if (sorted.ok) throw new Error("There is a loop.");
    expect(sorted.edge).toBe(3);
    const first = sorted.loop.indexOf(1);
    expect([...sorted.loop.slice(first), ...sorted.loop.slice(0, first)]).toEqual([1, 2, 3]);
  });

  test("of one node is a loop", () => {
    expect(
      sort(2, [
        [0, 1],
        [1, 1],
      ]),
    ).toEqual({ ok: false, loop: [1], edge: 1 });
  });

  test("is one of several, and leaves out what hangs below it", () => {
    const sorted = sort(7, [
      [0, 1],
      [1, 0],
      [1, 2],
      [3, 4],
      [4, 3],
      [4, 6],
    ]);
    if (sorted.ok) throw new Error("There is a loop.");
    expect([
      [0, 1],
      [3, 4],
    ]).toContainEqual([...sorted.loop].sort());
  });
});

test("groupEdges keeps the order of the input within a parent", () => {
  const { starts, edges } = groupEdges(4, Int32Array.of(2, 0, 2, 3, 0));
  expect([...starts]).toEqual([0, 2, 2, 4, 5]);
  expect([...edges]).toEqual([1, 4, 0, 2, 3]);
});
