import { partKey } from "~/domain/planning/part-key";
import { KIND_RULES, type KindRule } from "./kind-rules";
import type { BalanceState, BinSide, MovementRequest } from "./types";

/** One thing wrong with a movement as it is asked for. */
export interface MovementProblem {
  field: keyof MovementRequest;
  value?: string;
  message: string;
}

const MOST = { reason: 500, reference: 120, lot: 80 } as const;
const MOMENT = /^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d)$/;
const CLOCK_DIFFERENCE = 5 * 60_000;

/**
 * What is wrong with a movement by itself: sides and states that its kind does not have, a missing reason, texts too
 * long, a moment that cannot be or has not come yet. Part, bins and quantity are checked where the part is known.
 * @param now milliseconds since 1970
 */
export function checkMovement(movement: MovementRequest, now: number): MovementProblem[] {
  const rule = KIND_RULES[movement.kind];
  return [
    ...checkSides(movement, rule),
    ...checkStates(movement, rule),
    ...checkTexts(movement, rule),
    ...checkMoment(movement.happenedAt ?? null, now),
  ];
}

function checkSides({ kind, from, to }: MovementRequest, rule: KindRule): MovementProblem[] {
  const given = from && to ? "both" : from ? "from" : to ? "to" : "none";
  if (rule.sides === given || (rule.sides === "either" && (given === "from" || given === "to"))) return [];
  const wanted = {
    from: "only the bin it comes from",
    to: "only the bin it goes to",
    both: "the bin it comes from and the bin it goes to",
    either: "either the bin it comes from or the bin it goes to",
  }[rule.sides];
  return [{ field: to ? "to" : "from", message: `A movement of kind ${kind} names ${wanted}.` }];
}

function checkStates({ kind, from, to }: MovementRequest, rule: KindRule): MovementProblem[] {
  const problems = [
    ...checkState("from", kind, from, rule.fromStates),
    ...checkState("to", kind, to, rule.toStates),
  ];
  if (problems.length > 0 || kind !== "move" || !from || !to) return problems;
  if ((from.state === "held") !== (to.state === "held")) {
    return [{ field: "to", value: to.state, message: "A move leaves held stock held; use hold or release." }];
  }
  if (from.state === to.state && partKey(from.bin) === partKey(to.bin)) {
    return [{ field: "to", value: to.bin, message: "A move goes to another bin or another state." }];
  }
  return [];
}

function checkState(
  field: "from" | "to",
  kind: string,
  side: BinSide | null | undefined,
  allowed: readonly BalanceState[],
): MovementProblem[] {
  if (!side || allowed.length === 0 || allowed.includes(side.state)) return [];
  const message = `A movement of kind ${kind} ${field === "from" ? "takes" : "brings"} stock that is ${allowed.join(" or ")}.`;
  return [{ field, value: side.state, message }];
}

function checkTexts(movement: MovementRequest, rule: KindRule): MovementProblem[] {
  const problems: MovementProblem[] = [];
  if (rule.needsReason && !movement.reason?.trim()) {
    problems.push({ field: "reason", message: "Give the reason of the adjustment." });
  }
  for (const field of ["reason", "reference", "lot"] as const) {
    if ((movement[field]?.trim().length ?? 0) > MOST[field]) {
      problems.push({ field, message: `Keep the ${field} to ${MOST[field]} characters.` });
    }
  }
  return problems;
}

function checkMoment(happenedAt: string | null, now: number): MovementProblem[] {
  if (happenedAt === null) return [];
  const moment = MOMENT.test(happenedAt) ? Date.parse(happenedAt) : Number.NaN;
  if (Number.isNaN(moment)) {
    return [{ field: "happenedAt", value: happenedAt, message: "Write the moment as 2026-12-01T09:30:00Z." }];
  }
  if (moment <= now + CLOCK_DIFFERENCE) return [];
  return [
    {
      field: "happenedAt",
      value: happenedAt,
      message: "A movement has happened already; its moment cannot be in the future.",
    },
  ];
}
