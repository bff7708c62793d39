import type { Transaction } from "sequelize";
import { partKey } from "~/domain/planning/part-key";
import type { StepsProblem } from "~/domain/quantity/parse-steps";
import { parseSteps } from "~/domain/quantity/parse-steps";
import { makeLegs } from "~/domain/stock/make-legs";
import { parseStored } from "~/domain/stock/parse-stored";
import { STORED_LIMIT } from "~/domain/stock/stored-decimals";
import type { BinSide, MovementRequest } from "~/domain/stock/types";
import { AppError, type FieldError } from "~/utils/errors";
import type { MovementDraft } from "./append-movements.server";
import { findBins } from "./find-bins.server";
import { findOrMakeLots, lotKey } from "./find-or-make-lots.server";
import { findStockParts, type StockPart } from "./find-stock-parts.server";

/** A movement with its part, as it is posted. */
export interface LookedUpMovement {
  draft: MovementDraft;
  part: StockPart;
  lotCode: string;
}

interface Found {
  parts: ReadonlyMap<string, StockPart>;
  bins: ReadonlyMap<string, { id: number }>;
}

/**
 * Looks up part, bins and lot of every movement, makes lots that are new, and checks quantities against their parts.
 * @param now stands for the moment of a movement that gives none
 * @throws AppError "invalid" with an error for everything that is unknown or does not fit
 */
export async function lookUpMovements(
  movements: readonly MovementRequest[],
  now: Date,
  transaction: Transaction,
): Promise<LookedUpMovement[]> {
  const codes = movements.flatMap(({ from, to }) => [from, to].flatMap((side) => (side ? [side.bin] : [])));
  const parts = await findStockParts(
    movements.map((movement) => movement.partNumber),
    transaction,
  );
  const found: Found = { parts, bins: await findBins(codes, transaction) };
  const errors = movements.flatMap((movement, index) => check(movement, index + 1, found));
  if (errors.length > 0)
    throw new AppError("invalid", "Some movements cannot be posted; nothing was changed.", { errors });
  const partOf = (movement: MovementRequest) => parts.get(partKey(movement.partNumber)) as StockPart;
  const wanted = movements.map((movement) => ({
    partId: partOf(movement).id,
    lotCode: lotCodeOf(movement),
    expiresOn: movement.expiresOn,
  }));
  const lots = await findOrMakeLots(wanted, transaction);
  return movements.map((movement, index) => ({
    draft: draftOf(movement, partOf(movement), lots.get(lotKey(wanted[index])) as number, found, now),
    part: partOf(movement),
    lotCode: wanted[index].lotCode,
  }));
}

/** A lot code as it is kept: compared byte by byte, without the spaces around it. */
export function lotCodeOf({ lot }: Pick<MovementRequest, "lot">): string {
  return (lot ?? "").normalize("NFC").trim();
}

function draftOf(
  movement: MovementRequest,
  part: StockPart,
  lotId: number,
  { bins }: Found,
  now: Date,
): MovementDraft {
  const sideOf = (side: BinSide | null | undefined) =>
    side ? { binId: (bins.get(partKey(side.bin)) as { id: number }).id, state: side.state } : null;
  const quantity = parseStored(movement.quantity);
  const [from, to] = [sideOf(movement.from), sideOf(movement.to)];
  return {
    kind: movement.kind,
    happenedAt: movement.happenedAt ? new Date(movement.happenedAt) : now,
    reason: movement.reason?.trim() ?? "",
    reference: movement.reference?.trim() ?? "",
    reverses: null,
    legs: makeLegs({ kind: movement.kind, partId: part.id, lotId, quantity, from, to }),
  };
}

function check(movement: MovementRequest, line: number, { parts, bins }: Found): FieldError[] {
  const part = parts.get(partKey(movement.partNumber));
  const errors: FieldError[] = [];
  if (!part) {
    const message = `There is no part ${movement.partNumber}; correct the part number or enter the part first.`;
    errors.push({ line, field: "partNumber", value: movement.partNumber, message });
  }
  for (const field of ["from", "to"] as const) {
    const side = movement[field];
    if (!side || bins.has(partKey(side.bin))) continue;
    const message = `There is no bin ${side.bin}; correct the code or enter the bin first.`;
    errors.push({ line, field, value: side.bin, message });
  }
  const fault = part && quantityFault(movement.quantity, part);
  if (fault) errors.push({ line, field: "quantity", value: movement.quantity, message: fault });
  return errors;
}

function quantityFault(text: string, { partNumber, decimals, unit }: StockPart): string | null {
  const parsed = parseSteps(text, decimals);
  const faults: Record<StepsProblem, string> = {
    "not-a-number": "Write the quantity in plain digits, such as 12 or 0.350.",
    negative: "Write the quantity above 0; the bins say which way it goes.",
    "too-many-decimals": `${partNumber} is counted in ${unit} with ${decimals} decimals; write no more.`,
  };
  if (!parsed.ok) return faults[parsed.code];
  if (parsed.steps === 0) return faults.negative;
  return parseStored(text) < STORED_LIMIT ? null : "Keep the quantity below 100,000,000,000,000.";
}
