import { describe, expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import { dayNumber } from "~/domain/planning/dates/day-number";
import { isLimited } from "~/domain/planning/netting/limits";
import { offeredOptions, splitDemand } from "~/domain/planning/netting/split-demand";
import type { PlanDemand, PlanLine, PlanPart } from "~/domain/planning/types";
import { buildDemand, buildLine, buildPart, TODAY } from "../../../support/planning/factories";

function compile(lines: PlanLine[], parts: PlanPart[] = []) {
  const compiled = compileStructure(
    [
      buildPart({ partNumber: "K", sourcing: "make" }),
      buildPart({ partNumber: "PH", sourcing: "phantom" }),
      buildPart({ partNumber: "A" }),
      ...parts,
    ],
    lines,
  );
  if (!compiled.ok) throw new Error(JSON.stringify(compiled.problems));
  return compiled.structure;
}

const onKit = (rest: Partial<PlanLine>) => buildLine({ parent: "K", component: "A", ...rest });

function split(lines: PlanLine[], demand: PlanDemand) {
  const result = splitDemand(compile(lines), demand, 3, dayNumber(TODAY));
  if (!result.ok) return result.problem;
  const say = ({ kits, active }: { kits: number | bigint; active: Uint8Array }) =>
    `${kits === Number.MAX_SAFE_INTEGER ? "rest" : kits}: ${[...active].join("")}`;
  return { asked: result.split.segments.map(say), beyond: result.split.beyond.map(say) };
}

describe("effectivity by serial cuts a demand", () => {
  const lines = [onKit({ toSerial: "SC-010" }), onKit({ fromSerial: "SC-011", toSerial: "SC-014" })];

  test.each([
    ["SC-001", "5", ["5: 10"], ["5: 10", "4: 01", "rest: 00"]],
    ["SC-008", "5", ["3: 10", "2: 01"], ["2: 01", "rest: 00"]],
    ["SC-008", "3", ["3: 10"], ["4: 01", "rest: 00"]],
    ["SC-009", "9", ["2: 10", "4: 01", "3: 00"], ["rest: 00"]],
    ["SC-020", "2", ["2: 00"], ["rest: 00"]],
  ])("%s, %s kits", (serial, quantity, asked, beyond) => {
    expect(split(lines, buildDemand("K", quantity, { serial }))).toEqual({ asked, beyond });
  });

  test("and not without a serial: what ends before some serial is out", () => {
    expect(split(lines, buildDemand("K", "50"))).toEqual({ asked: ["50: 00"], beyond: ["rest: 00"] });
  });
});

test.each([
  ["no option", {}, "0100"],
  ["one", { options: ["CAB"] }, "1100"],
  ["by its day", { due: "2027-06-01" }, "0110"],
  ["the first day belongs", { due: "2027-01-01" }, "0110"],
  ["the last day belongs", { due: "2026-12-31" }, "0101"],
])("lines that count: %s", (_, asked, active) => {
  const lines = [
    onKit({ option: "CAB" }),
    onKit({ fromDate: "2026-01-01" }),
    onKit({ fromDate: "2027-01-01" }),
    onKit({ fromDate: "2026-12-02", toDate: "2026-12-31" }),
  ];
  expect(split(lines, buildDemand("K", "1", asked))).toMatchObject({ asked: [`1: ${active}`] });
});

test.each([
  [buildDemand("X", "1"), { code: "unknown-part", demand: 3, partNumber: "X" }],
  [
    buildDemand("K", "1", { options: ["CAB", "TRL"] }),
    { code: "unknown-option", demand: 3, partNumber: "K", option: "TRL", offered: ["CAB"] },
  ],
  [buildDemand("K", "1", { serial: "SC" }), { code: "bad-serial", demand: 3, serial: "SC" }],
])("refuses %o", (demand, problem) => {
  expect(split([onKit({ option: "CAB" })], demand)).toEqual(problem);
});

test("a kit offers what its own lines and those of phantoms below it name", () => {
  const structure = compile(
    [
      onKit({ option: "CAB" }),
      onKit({ option: "AIR", quantity: null }),
      buildLine({ parent: "K", component: "PH" }),
      buildLine({ parent: "PH", component: "A", option: "HEAT" }),
      buildLine({ parent: "OTHER", component: "A", option: "SAIL" }),
    ],
    [buildPart({ partNumber: "OTHER", sourcing: "make" })],
  );
  const offered = (part: string) => offeredOptions(structure, structure.numberOf.get(part) as number);
  expect(offered("K")).toEqual(["AIR", "CAB", "HEAT"]);
  expect(offered("OTHER")).toEqual(["SAIL"]);
  expect(offered("A")).toEqual([]);
});

test.each<[string, PlanLine[], number[], boolean]>([
  ["a bought part", [onKit({})], [], true],
  ["a line of nothing", [onKit({ quantity: "0" })], [], false],
  ["a line as required", [onKit({ quantity: null })], [], false],
  ["a condition that holds", [onKit({ option: "CAB" })], [1], true],
  ["a condition that does not", [onKit({ option: "CAB" })], [0], false],
  ["nothing but a phantom without lines", [buildLine({ parent: "K", component: "PH" })], [], true],
])("%s limits a kit: %s", (_, lines, active, limited) => {
  const structure = compile(lines);
  const kit = structure.numberOf.get("K") as number;
  expect(isLimited(structure, kit, Uint8Array.from(active))).toBe(limited);
});
