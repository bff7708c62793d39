import path from "node:path";
import { expect, test } from "vitest";
import { type Files, runPlanCommand, runPlanHere, withFiles } from "../support/run-plan-command";

const parts = "part_number,sourcing,decimals,yield\nKIT,make,0,\nSUB,make,0,\nBOLT,buy,0,\nTAPE,buy,3,\n";
const structure = "parent,component,quantity\nKIT,SUB,2\nSUB,BOLT,4\nKIT,TAPE,0.350\n";

function run(files: Files, more: string[] = [], command = runPlanHere) {
  const all: Files = { "parts.csv": parts, "structure.csv": structure, ...files };
  return withFiles(all, (folder) => {
    const flags = ["parts", "structure", "stock", "supply"]
      .filter((kind) => all[`${kind}.csv`] !== undefined)
      .flatMap((kind) => [`--${kind}`, path.join(folder, `${kind}.csv`)]);
    const demand = more.includes("--demand") ? [] : ["--demand", "KIT=10"];
    return command([...flags, ...demand, ...more]);
  });
}

async function expectRefused(result: ReturnType<typeof run>, ...said: string[]) {
  const { code, stdout, stderr } = await result;
  expect({ code, stdout }, stderr).toEqual({ code: 2, stdout: "" });
  for (const words of said) expect(stderr).toContain(words);
  expect(stderr).not.toMatch(/^\s+at /m);
  expect(stderr).toContain("expected");
}

/** The files, then what the message must hold. */
const badFiles: [string, Files, string[]][] = [
  [
    "a loop",
    {
      "parts.csv": "part_number,sourcing\nA-100,make\nB-200,make\nC-300,make\nKIT,make\n",
      "structure.csv":
        "parent,component,quantity\nKIT,A-100,1\nA-100,B-200,1\nB-200,C-300,1\nC-300,A-100,1\n",
    },
    ["structure.csv, line 5", "A-100 > B-200 > C-300 > A-100"],
  ],
  [
    "a part that contains itself",
    { "structure.csv": "parent,component,quantity\nKIT,KIT,1\n" },
    ["structure.csv, line 2", "KIT > KIT"],
  ],
  [
    "an unknown component",
    { "structure.csv": `${structure}SUB,NUT,1\n` },
    ["structure.csv, line 5, column component", '"NUT"'],
  ],
  [
    "an unknown parent",
    { "structure.csv": `${structure}NUT,BOLT,1\n` },
    ["structure.csv, line 5, column parent", '"NUT"'],
  ],
  [
    "an unknown part in stock",
    { "stock.csv": "part_number,quantity\nNUT,1\n" },
    ["stock.csv, line 2, column part_number", '"NUT"'],
  ],
  [
    "an unknown part in supply",
    { "supply.csv": "part_number,quantity\nNUT,1\n" },
    ["supply.csv, line 2, column part_number", '"NUT"'],
  ],
  [
    "a duplicate part number",
    { "parts.csv": `${parts}BOLT,buy,0,\n` },
    ["parts.csv, line 6, column part_number", '"BOLT"', "line 4"],
  ],
  [
    "a part number that differs by case alone",
    { "parts.csv": `${parts}bolt,buy,0,\n` },
    ["parts.csv, line 6, column part_number", '"bolt"', "line 4"],
  ],
  ...[
    "-1",
    "1e3",
    "1.00E+05",
    "NaN",
    "Infinity",
    "-Infinity",
    "ten",
    "+5",
    '"1,000"',
    "1 000",
    "0x10",
    "1_000",
    ".",
  ].map((quantity): [string, Files, string[]] => [
    `the quantity ${quantity}`,
    { "stock.csv": `part_number,quantity\nTAPE,${quantity}\n` },
    ["stock.csv, line 2, column quantity", quantity.replaceAll('"', "")],
  ]),
  [
    "an empty quantity in stock",
    { "stock.csv": "part_number,quantity\nTAPE,\n" },
    ["stock.csv, line 2, column quantity", "an empty cell"],
  ],
  [
    "more decimals than the part has, in stock",
    { "stock.csv": "part_number,quantity\nTAPE,1.2345\n" },
    ["stock.csv, line 2, column quantity", "1.2345", "at most 3 decimals"],
  ],
  [
    "half a bolt",
    { "structure.csv": "parent,component,quantity\nKIT,BOLT,1.5\n" },
    ["structure.csv, line 2, column quantity", "1.5", "a whole number"],
  ],
  [
    "more decimals than the part has, in supply",
    { "supply.csv": "part_number,quantity\nBOLT,0.1\n" },
    ["supply.csv, line 2, column quantity", "0.1"],
  ],
  ...["1", "1.5", "-0.1", "2%", "1e-2"].map((scrap): [string, Files, string[]] => [
    `scrap ${scrap}`,
    { "structure.csv": `parent,component,quantity,scrap\nKIT,BOLT,1,${scrap}\n` },
    ["structure.csv, line 2, column scrap", scrap],
  ]),
  ...["0", "0.0", "1.01", "-1", "85%"].map((fraction): [string, Files, string[]] => [
    `yield ${fraction}`,
    { "parts.csv": parts.replace("SUB,make,0,", `SUB,make,0,${fraction}`) },
    ["parts.csv, line 3, column yield", fraction],
  ]),
  ...["2026-02-30", "2027-02-29", "2026-13-01", "01/02/2026", "2026-1-5", "tomorrow"].map(
    (day): [string, Files, string[]] => [
      `the date ${day}`,
      { "supply.csv": `part_number,quantity,due\nBOLT,5,${day}\n` },
      ["supply.csv, line 2, column due", day],
    ],
  ),
  [
    "an unknown header",
    { "parts.csv": "part_number,sourcing,colour\nKIT,make,red\n" },
    ["parts.csv, line 1", '"colour"'],
  ],
  [
    "a missing header",
    { "structure.csv": "parent,component\nKIT,SUB\n" },
    ["structure.csv, line 1", "quantity"],
  ],
  [
    "a doubled header",
    { "stock.csv": "part_number,quantity,quantity\nBOLT,1,2\n" },
    ["stock.csv, line 1, column quantity", "twice"],
  ],
  [
    "an unclosed quote, by the line on which it opened",
    { "stock.csv": 'part_number,bin,quantity\nBOLT,A1,5\nTAPE,"A2,7\nTAPE,A3,8\n' },
    ["stock.csv, line 3, column bin", "quote"],
  ],
  [
    "a line number after a cell of several lines",
    {
      "parts.csv": 'part_number,sourcing,description\nKIT,make,"of\nthree\nlines"\nSUB,buy,\nBOLT,bought,\n',
    },
    ["parts.csv, line 6, column sourcing", '"bought"'],
  ],
  [
    "an unknown sourcing",
    { "parts.csv": parts.replace("BOLT,buy", "BOLT,steal") },
    ["parts.csv, line 4, column sourcing", '"steal"', "buy, make or phantom"],
  ],
  [
    "decimals above 6",
    { "parts.csv": parts.replace("TAPE,buy,3", "TAPE,buy,7") },
    ["parts.csv, line 5, column decimals", '"7"'],
  ],
  [
    "an unknown state",
    { "stock.csv": "part_number,quantity,state\nBOLT,5,lost\n" },
    ["stock.csv, line 2, column state", '"lost"', "usable or held"],
  ],
  [
    "an option where it may not stand",
    { "structure.csv": `parent,component,quantity,option\nKIT,SUB,2,\nSUB,BOLT,4,RED\n` },
    ["structure.csv, line 3, column option", '"RED"'],
  ],
  [
    "effectivity where it may not stand",
    { "structure.csv": `parent,component,quantity,from_serial\nKIT,SUB,2,\nSUB,BOLT,4,098\n` },
    ["structure.csv, line 3, column from_serial", '"098"'],
  ],
  ["a row with too many cells", { "structure.csv": `${structure}KIT,BOLT,1,2\n` }, ["structure.csv, line 5"]],
  ["a row with too few cells", { "structure.csv": `${structure}KIT,BOLT\n` }, ["structure.csv, line 5"]],
  ["an empty file", { "structure.csv": "" }, ["structure.csv", "empty"]],
  [
    "a control character in a part number",
    { "parts.csv": `${parts}B\u0007,buy,0,\n` },
    ["parts.csv, line 6"],
  ],
];

test.each(badFiles)("%s", (_, files, said) => expectRefused(run(files), ...said));

const oneOfAKind = [
  "a loop",
  "an unknown component",
  "a duplicate part number",
  "the quantity -1",
  "the quantity NaN",
  "the quantity 1e3",
  "the quantity ten",
  "half a bolt",
  "scrap 1",
  "yield 0",
  "the date 2026-02-30",
  "an unknown header",
  "an unclosed quote, by the line on which it opened",
  "an option where it may not stand",
];

test.each(badFiles.filter(([name]) => oneOfAKind.includes(name)))(
  "in a process of its own: %s",
  (_, files, said) => expectRefused(run(files, [], runPlanCommand), ...said),
  60_000,
);

test.each(["KIT=0", "KIT=0.5"])(
  "in a process of its own: %s",
  (demand) => expectRefused(run({}, ["--demand", demand], runPlanCommand), demand),
  60_000,
);

test.each<[string, string[], string[]]>([
  ["zero kits", ["--demand", "KIT=0"], ["KIT=0", '"0"', "whole number of kits"]],
  ["half a kit", ["--demand", "KIT=0.5"], ["KIT=0.5", '"0.5"']],
  ["two and a half kits", ["--demand", "KIT=2.5"], ['"2.5"']],
  ["negative kits", ["--demand", "KIT=-1"], ['"-1"']],
  ["kits in words", ["--demand", "KIT=ten"], ['"ten"']],
  ["an exponent", ["--demand", "KIT=1e1"], ['"1e1"']],
  ["no quantity", ["--demand", "KIT="], ["KIT="]],
  ["no equals sign", ["--demand", "KIT"], ["KIT"]],
  ["an unknown kit", ["--demand", "KAT=1"], ['"KAT"', "unknown part"]],
  ["an option that the kit has not", ["--demand", "KIT=1:RED"], ['"RED"']],
  ["an impossible day", ["--demand", "KIT=1@2026-02-30"], ['"2026-02-30"']],
  ["a serial without digits", ["--demand", "KIT=1#SC"], ['"SC"']],
  ["an impossible today", ["--today", "2026-02-30"], ["--today", '"2026-02-30"']],
  ["an unknown sharing", ["--sharing", "fair"], ["--sharing", '"fair"', "strict or release"]],
  ["an unknown format", ["--format", "xml"], ["--format", '"xml"']],
])("%s", (_, more, said) => expectRefused(run({}, more), ...said));

test("an unknown flag", async () => {
  const { code, stdout, stderr } = await run({}, ["--colour", "red"]);
  expect({ code, stdout }).toEqual({ code: 2, stdout: "" });
  expect(stderr).toContain("--colour");
  expect(stderr).not.toMatch(/^\s+at /m);
});

test("a missing file and a folder in place of one", () =>
  withFiles({ "parts.csv": parts }, async (folder) => {
    const flags = ["--parts", path.join(folder, "parts.csv"), "--demand", "KIT=1", "--structure"];
    await expectRefused(
      runPlanCommand([...flags, path.join(folder, "none.csv")]),
      "none.csv",
      "no such file",
    );
    await expectRefused(runPlanHere([...flags, folder]), folder, "folder");
    await expectRefused(runPlanHere([...flags, "/dev/zero"]), "/dev/zero", "device");
  }));

test("a flag that is missing or given twice", async () => {
  await expectRefused(runPlanHere(["--demand", "KIT=1"]), "--parts");
  await expectRefused(run({}, ["--today", "2026-01-01", "--today", "2026-01-02"]), "--today", "twice");
});

test("many problems at once, the first twenty in full", async () => {
  const rows = Array.from({ length: 30 }, (_, at) => `X${at},1`).join("\n");
  const { code, stderr } = await run({ "stock.csv": `part_number,quantity\n${rows}\n` });
  expect(code).toBe(2);
  expect(stderr.trim().split("\n")).toHaveLength(21);
  expect(stderr).toContain("10 more");
});
