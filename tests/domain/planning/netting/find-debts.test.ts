import { expect, test } from "vitest";
import { findDebts } from "~/domain/planning/netting/find-debts";

type Takes = Record<number, number>[];
const taken = (demands: Takes) =>
  demands.map((parts) => new Map(Object.entries(parts).map(([part, quantity]) => [Number(part), quantity])));

test.each<[string, Takes, Takes, [part: number, quantity: number, from: number, to: number][]]>([
  ["nothing changes hands", [{ 1: 5 }, { 1: 2 }], [{ 1: 5 }, { 1: 2 }], []],
  ["a later one takes an earlier one's", [{ 1: 5 }, {}], [{ 1: 2 }, { 1: 3 }], [[1, 3, 1, 0]]],
  ["what only the later one takes more is no debt", [{ 1: 5 }, {}], [{ 1: 5 }, { 1: 3 }], []],
  ["what nobody takes instead is no debt", [{ 1: 5 }, {}], [{}, {}], []],
  [
    "two later ones owe in their order",
    [{ 1: 5 }, {}, {}],
    [{}, { 1: 2 }, { 1: 3 }],
    [
      [1, 2, 1, 0],
      [1, 3, 2, 0],
    ],
  ],
  [
    "one owes to two, to the first one first",
    [{ 1: 2 }, { 1: 2 }, {}],
    [{}, {}, { 1: 3 }],
    [
      [1, 2, 2, 0],
      [1, 1, 2, 1],
    ],
  ],
  [
    "several parts by their number",
    [{ 9: 1, 2: 1 }, {}],
    [{}, { 9: 1, 2: 1 }],
    [
      [2, 1, 1, 0],
      [9, 1, 1, 0],
    ],
  ],
  ["an earlier one owes nothing to a later", [{}, { 1: 5 }], [{ 1: 5 }, {}], []],
])("%s", (_, kept, released, debts) => {
  expect(findDebts(taken(kept), taken(released))).toEqual(
    debts.map(([part, quantity, from, to]) => ({ part, quantity, from, to })),
  );
});
