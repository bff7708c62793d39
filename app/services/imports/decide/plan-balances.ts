import { partKey } from "~/domain/planning/part-key";
import { formatSteps } from "~/domain/quantity/format-steps";
import { requireSteps } from "~/domain/quantity/parse-steps";
import { addSteps, type Steps, subtractSteps } from "~/domain/quantity/steps";
import type { MovementRequest } from "~/domain/stock/types";
import type { StockRow } from "~/schemas/imports/stock";
import { type BookBalances, balancePlace, lotPlace } from "~/services/imports/book/read-balances.server";
import type { BookPart } from "~/services/imports/book/read-book-names.server";
import { checkDecimals } from "~/services/imports/files/check-decimals";
import { checkStored } from "~/services/imports/files/check-stored";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { unknownPart } from "~/services/imports/files/structure-problem";
import type { Decision } from "~/services/imports/import-job";
import type { CsvProblem } from "~/utils/csv/csv-problem";

/** Stock that is given without a bin lies here. */
const noBin = "STORES";

/** A balance as the file wants it. */
export interface BalanceGoal {
  part: BookPart;
  bin: string;
  newBin: boolean;
  lot: string;
  state: StockRow["state"];
  onHand: Steps;
  wanted: Steps;
  expiresOn: string | null;
  /** The lot is there and has another date. */
  dateChanges: boolean;
}

interface PlannedBalances {
  decisions: Decision[];
  goals: BalanceGoal[];
}

/** The adjustment that takes a balance to its goal; null where it is there. */
export function adjustmentOf(goal: BalanceGoal): MovementRequest | null {
  const change = subtractSteps(goal.wanted, goal.onHand);
  if (change === 0) return null;
  const side = { bin: goal.bin, state: goal.state };
  const size = change < 0 ? subtractSteps(0, change) : change;
  return {
    kind: "adjust",
    partNumber: goal.part.name,
    quantity: formatSteps(size, goal.part.decimals),
    lot: goal.lot,
    ...(change < 0 ? { from: side } : { to: side }),
    reason: "Stock import",
    expiresOn: goal.expiresOn,
  };
}

function checkRow(row: ImportRow<StockRow>, part: BookPart | undefined): CsvProblem[] {
  if (part === undefined) return [unknownPart(row, "part_number")];
  const { quantity } = row.value;
  return [
    checkDecimals(row, "quantity", quantity, { partNumber: part.name, decimals: part.decimals }),
    checkStored(row, "quantity", quantity),
  ].filter((problem) => problem !== null);
}

function startGoal({ value }: ImportRow<StockRow>, part: BookPart, book: BookBalances): BalanceGoal {
  const typed = value.bin || noBin;
  const known = book.bins.get(partKey(typed));
  const { lot, state, expiresOn } = value;
  const onHand = book.quantities.get(balancePlace({ partId: part.id, bin: typed, lot, state })) ?? "0";
  const date = book.dates.get(lotPlace(part.id, lot));
  return {
    part,
    bin: known ?? typed,
    newBin: known === undefined,
    lot,
    state,
    onHand: requireSteps(onHand, part.decimals),
    wanted: 0,
    expiresOn,
    dateChanges: date !== undefined && expiresOn !== null && date !== expiresOn,
  };
}

/** Two rows of one lot must not give it two dates. */
function checkDate(row: ImportRow<StockRow>, part: BookPart, dates: Map<string, string>): CsvProblem[] {
  const { lot, expiresOn } = row.value;
  if (expiresOn === null) return [];
  const place = lotPlace(part.id, lot);
  const first = dates.get(place);
  dates.set(place, first ?? expiresOn);
  if (first === undefined || first === expiresOn) return [];
  return [{ ...row.at("expires_on"), expected: `${first}, which an earlier row gives the same lot` }];
}

/** Sums the rows up by balance and compares them with what is on hand. */
export function planBalances(
  rows: readonly ImportRow<StockRow>[],
  parts: ReadonlyMap<string, BookPart>,
  book: BookBalances,
): PlannedBalances {
  const goals = new Map<string, BalanceGoal>();
  const dates = new Map<string, string>();
  const decided = rows.map((row) => {
    const part = parts.get(partKey(row.value.partNumber));
    const problems = checkRow(row, part);
    if (part === undefined || problems.length > 0) return { row, goal: null, problems };
    problems.push(...checkDate(row, part, dates));
    const started = startGoal(row, part, book);
    const place = balancePlace({ partId: part.id, bin: started.bin, lot: started.lot, state: started.state });
    const goal = goals.get(place) ?? started;
    goals.set(place, goal);
    goal.wanted = addSteps(goal.wanted, requireSteps(row.value.quantity, part.decimals));
    goal.expiresOn ??= started.expiresOn;
    goal.dateChanges ||= started.dateChanges;
    return { row, goal, problems };
  });
  return { decisions: decided.map((each) => decide(each, book)), goals: [...goals.values()] };
}

function decide(
  { row, goal, problems }: { row: ImportRow<StockRow>; goal: BalanceGoal | null; problems: CsvProblem[] },
  book: BookBalances,
): Decision {
  if (goal === null) return { row, before: null, after: null, problems };
  const { part, bin, lot, state } = goal;
  const place = balancePlace({ partId: part.id, bin, lot, state });
  const date = book.dates.get(lotPlace(part.id, lot)) ?? null;
  const named = { partNumber: part.name, bin, lot, state };
  const quantity = (steps: Steps) => formatSteps(steps, part.decimals);
  const before = book.quantities.has(place)
    ? { ...named, quantity: quantity(goal.onHand), expiresOn: date }
    : null;
  const after = { ...named, quantity: quantity(goal.wanted), expiresOn: goal.expiresOn ?? date };
  const notes = goal.newBin ? [`The bin ${bin} is new and will be made.`] : [];
  return { row, before, after, problems, notes };
}
