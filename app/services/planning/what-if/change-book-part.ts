import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanPart } from "~/domain/planning/types";
import type { ShipQuestion } from "~/schemas/planning/what-if";
import { AppError } from "~/utils/errors";

type PartChange = ShipQuestion["whatIf"]["parts"][number];

/**
 * The part as it would be: what the change does not speak of stays as it is stored, a new part takes the
 * defaults. Throws 422 on `field` for a new part without sourcing.
 */
export function changeBookPart(structure: Structure, { given, part }: PartChange, field: string): PlanPart {
  const number = structure.numberOf.get(partKey(part.partNumber));
  if (number === undefined) {
    if (given.has("sourcing")) return part;
    const message = `There is no part ${part.partNumber} in the book: say its sourcing to add it.`;
    throw new AppError("invalid", message, { errors: [{ field, value: part.partNumber, message }] });
  }
  const stored = structure.parts[number];
  const pick = <Key extends keyof PlanPart>(column: string, key: Key) =>
    (given.has(column) ? part : stored)[key];
  return {
    partNumber: stored.partNumber,
    sourcing: pick("sourcing", "sourcing"),
    unit: pick("unit", "unit"),
    decimals: pick("decimals", "decimals"),
    leadTimeDays: pick("lead_time_days", "leadTimeDays"),
    yield: pick("yield", "yield"),
    unitCost: pick("unit_cost", "unitCost"),
    massKg: pick("mass_kg", "massKg"),
  };
}
