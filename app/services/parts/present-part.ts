import type { DecimalString } from "~/domain/planning/types";
import type { PresentedPart } from "~/schemas/parts/part-answer";
import { formatDecimals } from "~/utils/format/format-decimals";
import { trimDecimal } from "~/utils/format/trim-decimal";

/** The columns of `part` that every answer about a part shows. */
export const PART_COLUMNS = `part.id, part.part_number AS partNumber, part.description, part.sourcing, part.unit,
  part.decimals, part.lead_time_days AS leadTimeDays, part.safety_stock AS safetyStock, part.lot_rule AS lotRule,
  part.lot_minimum AS lotMinimum, part.lot_multiple AS lotMultiple, part.lot_maximum AS lotMaximum,
  part.lot_days AS lotDays, part.yield, part.unit_cost AS unitCost, part.mass_kg AS massKg, part.sold`;

export interface PartRow extends Omit<PresentedPart, "sold"> {
  id: number;
  sold: number;
}

export function presentPart({ id: _, ...row }: PartRow, seesCosts: boolean): PresentedPart {
  const quantity = (text: DecimalString | null) =>
    text === null ? null : formatDecimals(text, row.decimals);
  return {
    ...row,
    safetyStock: formatDecimals(row.safetyStock, row.decimals),
    lotMinimum: quantity(row.lotMinimum),
    lotMultiple: quantity(row.lotMultiple),
    lotMaximum: quantity(row.lotMaximum),
    yield: trimDecimal(row.yield),
    unitCost: seesCosts && row.unitCost !== null ? trimDecimal(row.unitCost) : null,
    massKg: row.massKg === null ? null : trimDecimal(row.massKg),
    sold: Boolean(row.sold),
  };
}
