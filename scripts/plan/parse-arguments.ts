import { parseArgs } from "node:util";
import type { PlanDemand, Sharing } from "~/domain/planning/types";
import { isIsoDate } from "~/schemas/fields/iso-date";
import { BadInput } from "./bad-input";
import { parseDemand } from "./parse-demand";

export interface PlanArguments {
  parts: string;
  structure: string;
  stock: string | null;
  supply: string | null;
  demand: PlanDemand[];
  /** Each demand as it was typed. */
  demandText: string[];
  sharing: Sharing;
  today: string;
  format: "json" | "table";
}

export const usage =
  "npm run --silent plan -- --parts P.csv --structure S.csv [--stock K.csv] [--supply O.csv] " +
  "--demand KIT=10[@YYYY-MM-DD][:OPTION+OPTION][#SERIAL] [--demand ...] [--sharing strict|release] " +
  "[--today YYYY-MM-DD] [--format json|table]";

const flag = { type: "string", multiple: true } as const;
const flags = {
  parts: flag,
  structure: flag,
  stock: flag,
  supply: flag,
  demand: flag,
  sharing: flag,
  today: flag,
  format: flag,
  help: { type: "boolean", short: "h" },
} as const;

function parse(argv: readonly string[]) {
  try {
    return parseArgs({ args: [...argv], options: flags, strict: true, allowPositionals: false }).values;
  } catch (error) {
    const [sentence] = (error instanceof Error ? error.message : String(error)).split("\n");
    throw new BadInput([sentence, `Usage: ${usage}`]);
  }
}

type Values = ReturnType<typeof parse>;
type Single = "parts" | "structure" | "stock" | "supply" | "sharing" | "today" | "format";

function single(values: Values, name: Single): string | null {
  const [first, second] = values[name] ?? [];
  if (second !== undefined) throw new BadInput([`--${name} is given twice; expected it once.`]);
  if (first?.trim() === "") throw new BadInput([`--${name}: found nothing; expected a value after it.`]);
  return first ?? null;
}

function required(values: Values, name: Single): string {
  const value = single(values, name);
  if (value === null)
    throw new BadInput([`--${name} is missing; expected a CSV file after it.`, `Usage: ${usage}`]);
  return value;
}

function oneOf<Word extends string>(values: Values, name: Single, words: readonly Word[]): Word {
  const value = single(values, name) ?? words[0];
  const word = words.find((each) => each === value);
  if (word === undefined) {
    throw new BadInput([`--${name}: found ${JSON.stringify(value)}; expected ${words.join(" or ")}.`]);
  }
  return word;
}

function dayOf(values: Values, now: Date): string {
  const pad = (number: number, width: number) => String(number).padStart(width, "0");
  const day = `${pad(now.getFullYear(), 4)}-${pad(now.getMonth() + 1, 2)}-${pad(now.getDate(), 2)}`;
  const today = single(values, "today") ?? day;
  if (isIsoDate(today)) return today;
  throw new BadInput([
    `--today: found ${JSON.stringify(today)}; expected a day of the calendar as YYYY-MM-DD, such as 2026-12-01.`,
  ]);
}

/** The command's arguments, checked; null when help is asked for. Throws BadInput. */
export function parseArguments(argv: readonly string[], now: Date): PlanArguments | null {
  const values = parse(argv);
  if (values.help) return null;
  const demandText = values.demand ?? [];
  const known = {
    parts: required(values, "parts"),
    structure: required(values, "structure"),
    stock: single(values, "stock"),
    supply: single(values, "supply"),
  };
  if (demandText.length === 0) {
    throw new BadInput([
      "--demand is missing; expected at least one, such as --demand KIT=10.",
      `Usage: ${usage}`,
    ]);
  }
  return {
    ...known,
    demandText,
    demand: demandText.map(parseDemand),
    sharing: oneOf(values, "sharing", ["strict", "release"]),
    today: dayOf(values, now),
    format: oneOf(values, "format", ["json", "table"]),
  };
}
