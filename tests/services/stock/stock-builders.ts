import { randomUUID } from "node:crypto";
import { Part } from "~/db/models/parts/part";
import { Bin } from "~/db/models/stock/bin";
import { partKey } from "~/domain/planning/part-key";
import type { MovementRequest } from "~/domain/stock/types";
import { postMovements } from "~/services/stock/post-movements.server";
import { AppError } from "~/utils/errors";

export const MANAGER = { personId: null, roles: ["manager" as const] };

export const newKey = () => `test-${randomUUID()}`;

export async function buildPart(
  partNumber: string,
  overrides: Partial<{ decimals: number; unit: string }> = {},
) {
  return Part.create({ partNumber, partKey: partKey(partNumber), sourcing: "buy", ...overrides });
}

export async function buildBin(code: string) {
  return Bin.create({ code, binKey: partKey(code) });
}

export const usable = (bin: string) => ({ bin, state: "usable" as const });

export const receive = (partNumber: string, quantity: string, bin: string): MovementRequest => ({
  kind: "receive",
  partNumber,
  quantity,
  to: usable(bin),
});

export const issue = (partNumber: string, quantity: string, bin: string): MovementRequest => ({
  kind: "issue",
  partNumber,
  quantity,
  from: usable(bin),
});

export function post(movements: MovementRequest[], idempotencyKey = newKey()) {
  return postMovements({ actor: MANAGER, idempotencyKey, movements });
}

/** As a client does that is told to come back: again with the same key. */
export async function postPatiently(movements: MovementRequest[], key = newKey()) {
  for (let tries = 1; ; tries++) {
    try {
      return await post(movements, key);
    } catch (error) {
      if (!(error instanceof AppError) || error.code !== "busy" || tries === 10) throw error;
    }
  }
}

/** The AppError of work that must fail. */
export async function faultOf(work: Promise<unknown>): Promise<AppError> {
  try {
    await work;
  } catch (error) {
    if (error instanceof AppError) return error;
    throw error;
  }
  throw new Error("This should have been refused.");
}
