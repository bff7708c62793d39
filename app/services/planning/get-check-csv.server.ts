import type { Shortage } from "~/domain/planning/types";
import type { CheckPart } from "~/schemas/planning/check-answer";
import type { CurrentPerson } from "~/services/people/current-person";
import { type CsvColumn, writeCsv } from "~/utils/csv/write-csv";
import { AppError } from "~/utils/errors";
import { type AskedCheck, getCheckAnswer } from "./get-check-answer.server";

interface Row {
  kits: string;
  /** The changes that were tried, and those that could not be, as the address holds them. */
  whatIf: string;
  notTried: string;
  shortage: Shortage;
  part: CheckPart | undefined;
}

const COLUMNS: CsvColumn<Row>[] = [
  { name: "kits", cell: (row) => row.kits },
  { name: "part_number", cell: (row) => row.shortage.partNumber },
  { name: "description", cell: (row) => row.part?.description ?? "" },
  { name: "supplier", cell: (row) => row.part?.supplier ?? "" },
  { name: "unit", cell: (row) => row.shortage.unit },
  { name: "needed", cell: (row) => row.shortage.gross },
  { name: "from_stock", cell: (row) => row.shortage.fromStock },
  { name: "on_order", cell: (row) => row.shortage.onOrder },
  { name: "short", cell: (row) => row.shortage.short },
  { name: "missing", cell: (row) => row.shortage.missing },
  { name: "stops_at", cell: (row) => row.shortage.stopsAt },
  { name: "need_by", cell: (row) => row.shortage.needBy },
  { name: "order_by", cell: (row) => row.shortage.orderBy },
  { name: "ready_on", cell: (row) => row.shortage.readyOn },
  { name: "what_if", cell: (row) => row.whatIf },
  { name: "not_tried", cell: (row) => row.notTried },
];

const COSTS: CsvColumn<Row>[] = [
  { name: "unit_cost", cell: (row) => row.part?.unitCost ?? null },
  { name: "cost", cell: (row) => row.part?.cost ?? null },
];

/**
 * The answer of Check as CSV: the parts that are missing, worst first, with their figures; costs for people who may
 * see them. Each row names the changes that were tried and those that could not be. @throws AppError "invalid" where there is no answer
 */
export async function getCheckCsv(asked: AskedCheck, person: CurrentPerson): Promise<string> {
  const { answer, parts, stoppers, ifs, seesCosts, problem } = await getCheckAnswer(asked, person);
  if (answer === null) throw new AppError("invalid", problem ?? "There is no kit in the book yet.");
  const { partNumber, quantity } = answer.demand[0];
  const known = new Map(parts.map((part) => [part.partNumber, part]));
  const place = new Map(stoppers.map((part, at) => [part, at]));
  const whatIf = ifs.filter((tried) => tried.problem === null).map(({ text }) => text);
  const notTried = ifs.filter((tried) => tried.problem !== null).map(({ text }) => text);
  const rows = answer.shortages
    .map((shortage) => ({
      kits: `${quantity} ${partNumber}`,
      whatIf: whatIf.join(" "),
      notTried: notTried.join(" "),
      shortage,
      part: known.get(shortage.partNumber),
    }))
    .sort((a, b) => (place.get(a.shortage.partNumber) ?? 0) - (place.get(b.shortage.partNumber) ?? 0));
  return writeCsv(seesCosts ? [...COLUMNS, ...COSTS] : COLUMNS, rows);
}
