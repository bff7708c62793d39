import type { Writable } from "node:stream";
import { checkShip } from "~/domain/planning/check-ship";
import { checkPlanFiles } from "~/services/imports/files/check-plan-files";
import { sayCsvProblem } from "~/utils/csv/say-csv-problem";
import { BadInput } from "./bad-input";
import { formatTable } from "./format-table";
import { type PlanArguments, parseArguments, usage } from "./parse-arguments";
import { readInputFile } from "./read-input-file";
import { sayDemandProblem } from "./say-demand-problem";

const mostProblems = 20;

async function answerPlan(given: PlanArguments): Promise<string> {
  const optional = (name: string | null, flag: string) => (name === null ? null : readInputFile(name, flag));
  const input = checkPlanFiles({
    parts: await readInputFile(given.parts, "parts"),
    structure: await readInputFile(given.structure, "structure"),
    stock: await optional(given.stock, "stock"),
    supply: await optional(given.supply, "supply"),
  });
  if (!input.ok) throw new BadInput(input.problems.map((problem) => sayCsvProblem(problem, problem.file)));
  const { structure, stock, supply } = input;
  const { demand, sharing, today } = given;
  const result = checkShip({ structure, stock, supply, demand, sharing, today });
  if (!result.ok) throw new BadInput(result.problems.map((each) => sayDemandProblem(each, given.demandText)));
  return given.format === "table"
    ? formatTable(result.answer)
    : `${JSON.stringify(result.answer, null, 2)}\n`;
}

interface Surroundings {
  stdout: Writable;
  stderr: Writable;
  now: Date;
}

function write(stream: Writable, text: string): Promise<void> {
  return new Promise((resolve) => stream.write(text, () => resolve()));
}

function sayBadInput(error: BadInput): string {
  const { sentences } = error;
  const more = sentences.length - mostProblems;
  const shown = more > 0 ? [...sentences.slice(0, mostProblems), `... and ${more} more.`] : sentences;
  return `${shown.join("\n")}\n`;
}

/** The command line: 0 with the answer on standard output, 2 with sentences on standard error. Needs no database. */
export async function runPlan(argv: readonly string[], around: Surroundings): Promise<number> {
  const { stdout, stderr, now } = around;
  // The reader may have gone (a pipe into head): nothing is left to say to it.
  for (const stream of [stdout, stderr]) stream.on("error", () => {});
  try {
    const given = parseArguments(argv, now);
    await write(stdout, given === null ? `${usage}\n` : await answerPlan(given));
    return 0;
  } catch (error) {
    if (error instanceof BadInput) {
      await write(stderr, sayBadInput(error));
      return 2;
    }
    const reason = error instanceof Error ? error.message : String(error);
    await write(stderr, `The plan could not be made, through a fault of the program: ${reason}\n`);
    return 1;
  }
}
