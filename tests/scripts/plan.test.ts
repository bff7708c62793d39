import { spawn } from "node:child_process";
import { once } from "node:events";
import path from "node:path";
import { expect, test } from "vitest";
import { type Files, runPlanCommand, runPlanHere, withFiles } from "../support/run-plan-command";

/** Kit, clutch and lift drive sharing one bolt: 9 kits from 100 bolts and three clutches built. */
const shop: Files = {
  "parts.csv":
    "part_number,sourcing,lead_time_days,unit_cost\nKIT,make,2,\nCLUTCH,make,3,\nLIFT,make,4,\nBOLT,buy,10,0.25\n",
  "structure.csv":
    "parent,component,quantity\nKIT,CLUTCH,1\nKIT,LIFT,1\nKIT,BOLT,2\nCLUTCH,BOLT,4\nLIFT,BOLT,6\n",
  "stock.csv": "part_number,quantity\nBOLT,60\nBOLT,40\nCLUTCH,3\n",
};

function plan(files: Files, demand: string[], more: string[] = [], command = runPlanHere) {
  return withFiles(files, (folder) => {
    const flags = Object.keys(files).flatMap((name) => [`--${name.slice(0, -4)}`, path.join(folder, name)]);
    const asked = demand.flatMap((each) => ["--demand", each]);
    return command([...flags, ...asked, "--today", "2026-12-01", ...more]);
  });
}

async function answer(files: Files, demand: string[], more: string[] = []) {
  const { code, stdout, stderr } = await plan(files, demand, more);
  expect({ code, stderr }).toEqual({ code: 0, stderr: "" });
  return JSON.parse(stdout);
}

test("answers with the shape of the contract", async () => {
  const given = await answer(shop, ["KIT=10"]);
  expect(Object.keys(given)).toEqual([
    "today",
    "demand",
    "buildable",
    "earliest",
    "ladder",
    "shortages",
    "builds",
    "criticalChain",
    "warnings",
  ]);
  expect(given).toMatchObject({
    today: "2026-12-01",
    buildable: { KIT: 9 },
    earliest: { KIT: "2026-12-17" },
    shortages: [{ partNumber: "BOLT", missing: "8", short: "8", stopsAt: 10 }],
  });
  expect(given.ladder).toHaveLength(10);
});

test("the process writes JSON and nothing else, and ends with 0", async () => {
  const { code, stdout, stderr } = await plan(shop, ["KIT=10"], [], runPlanCommand);
  expect({ code, stderr }).toEqual({ code: 0, stderr: "" });
  expect(JSON.parse(stdout)).toEqual(await answer(shop, ["KIT=10"]));
}, 60_000);

test("a table for people", async () => {
  const { code, stdout } = await plan(shop, ["KIT=10"], ["--format", "table"]);
  expect(code).toBe(0);
  expect(stdout).toContain("9 of 10 KIT can be made from what is on hand, all 10 by 2026-12-17.");
  for (const title of ["Ladder", "Shortages", "Builds to start", "Critical chain"])
    expect(stdout).toContain(title);
  expect(stdout).toMatch(/10 {2}KIT .* BOLT 8/);
});

test.each(["007", "1E05", "3-12", "__proto__", "constructor", "toString", "A=B@C:D#E", "1.00E+05", "ÅÄ-1"])(
  "a part number is text: %s",
  async (name) => {
    const given = await answer(
      {
        "parts.csv": `part_number,sourcing\nKIT,make\n${name},make\n7,buy\n`,
        "structure.csv": `parent,component,quantity\nKIT,${name},1\n${name},7,2\n`,
        "stock.csv": "part_number,quantity\n7,6\n",
      },
      ["KIT=2", `${name}=3`],
    );
    expect(Object.entries(given.buildable)).toEqual([
      ["KIT", 2],
      [name, 1],
    ]);
    expect(given.builds.map((build: { partNumber: string }) => build.partNumber)).toContain(name);
  },
);

test("date, options and serial of a demand", async () => {
  const files: Files = {
    "parts.csv": "part_number,sourcing\nKIT,make\nRADIO,buy\nHULL-1,buy\nHULL-3,buy\n",
    "structure.csv":
      "parent,component,quantity,option,from_serial,to_serial\nKIT,RADIO,1,RADIO,,\nKIT,HULL-1,1,,,100\nKIT,HULL-3,1,,101,\n",
    "stock.csv": "part_number,quantity\nHULL-1,5\nHULL-3,4\n",
  };
  const given = await answer(files, ["KIT=10@2027-03-01:RADIO#098"]);
  expect(given.demand).toMatchObject([
    { partNumber: "KIT", quantity: "10", due: "2027-03-01", options: ["RADIO"], serial: "098" },
  ]);
  const missing = given.shortages.map((part: { partNumber: string; missing: string }) => [
    part.partNumber,
    part.missing,
  ]);
  expect(missing).toEqual([
    ["HULL-3", "3"],
    ["RADIO", "10"],
  ]);
});

test("sharing by release tells the debts", async () => {
  const given = await answer(shop, ["KIT=5", "KIT=5"], ["--sharing", "release"]);
  expect(given.debts).toEqual([]);
  expect(given.demand).toHaveLength(2);
});

test("files of other makes: semicolons, byte order mark, Windows line ends, spaces in the name", async () => {
  const mark = "\ufeff";
  const given = await answer(
    {
      ...shop,
      "stock.csv": `${mark}quantity;part_number\r\n100;BOLT\r\n3;CLUTCH\r\n`,
      "parts.csv": Buffer.from(`${mark}${shop["parts.csv"]}`, "utf16le"),
    },
    ["KIT=10"],
  );
  expect(given.buildable).toEqual({ KIT: 9 });
});

test("empty cells take the defaults, and held stock is no stock", async () => {
  const given = await answer(
    {
      "parts.csv":
        "part_number,description,sourcing,unit,decimals,yield\nKIT,,make,,,\nGREASE,,buy,,,\nNUT,,buy,,,\n",
      "structure.csv": "parent,component,quantity,scrap\nKIT,GREASE,,\nKIT,NUT,2.0,\n",
      "stock.csv": "part_number,quantity,state\nNUT,4,usable\nNUT,100,held\n",
    },
    ["KIT=3"],
  );
  expect(given.buildable).toEqual({ KIT: 2 });
  expect(given.warnings).toEqual([{ code: "as-required-none-on-hand", partNumber: "GREASE" }]);
});

test("headers alone are files too", async () => {
  const files = {
    ...shop,
    "stock.csv": "part_number,quantity\n",
    "supply.csv": "part_number,quantity,due\n",
  };
  expect((await answer(files, ["KIT=1"])).buildable).toEqual({ KIT: 0 });
});

test(
  "a reader that goes away is no fault",
  () =>
    withFiles(shop, async (folder) => {
      const of = (kind: string) => path.join(folder, `${kind}.csv`);
      const flags = ["--parts", of("parts"), "--structure", of("structure"), "--demand", "KIT=1000"];
      const child = spawn(process.execPath, ["scripts/plan.mjs", ...flags], {
        stdio: ["ignore", "pipe", "pipe"],
      });
      let stderr = "";
      child.stderr.on("data", (text) => {
        stderr += text;
      });
      child.stdout.destroy();
      await once(child, "close");
      expect(stderr).toBe("");
    }),
  60_000,
);
