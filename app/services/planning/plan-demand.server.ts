import type { ShipPlan } from "~/domain/planning/plan-ship";
import { planShip } from "~/domain/planning/plan-ship";
import type { DemandProblem, PlanDemand, Sharing } from "~/domain/planning/types";
import { AppError, type FieldError } from "~/utils/errors";
import type { PlanBook } from "./get-plan-book.server";

/** Plans the demands over the book. Throws 404 for an unknown kit, 422 for options or serials that do not fit. */
export function planDemand(
  book: Pick<PlanBook, "structure" | "supplies">,
  demand: readonly PlanDemand[],
  sharing: Sharing,
  first: readonly PlanDemand[] = [],
): ShipPlan {
  const { structure, supplies } = book;
  const result = planShip({ structure, supplies, demand, sharing, first });
  if (result.ok) return result.plan;
  const errors = result.problems.map(sayDemandProblem);
  const isMissing = result.problems.some((problem) => problem.code === "unknown-part");
  throw new AppError(isMissing ? "not-found" : "invalid", errors[0].message, { errors });
}

/** A sentence for what a demand cannot be planned with. */
function sayDemandProblem(problem: DemandProblem): FieldError {
  if (problem.code === "unknown-part") {
    const { partNumber } = problem;
    return {
      field: "kit",
      value: partNumber,
      message: `There is no part ${partNumber} in the book. Choose a kit that is.`,
    };
  }
  if (problem.code === "unknown-option") {
    const { partNumber, option, offered } = problem;
    const choice = offered.length > 0 ? `It offers ${offered.join(", ")}.` : "It offers none.";
    return { field: "options", value: option, message: `${partNumber} has no option ${option}. ${choice}` };
  }
  const { serial } = problem;
  return { field: "serial", value: serial, message: `The serial ${serial} must end in digits, such as 098.` };
}
