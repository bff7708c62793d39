import type { Shortage } from "~/domain/planning/types";
import type { CheckPageAnswer, CheckPart } from "~/schemas/planning/check-answer";
import { formatIf } from "~/schemas/planning/if-text";
import { alignOnPoint } from "~/utils/format/align-on-point";
import { formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatQuantity } from "~/utils/format/format-quantity";
import { unitSymbol } from "~/utils/format/unit-symbol";

/** A line of the table of stoppers, written out. */
export interface StopperRow {
  partNumber: string;
  description: string;
  supplier: string | null;
  unit: string;
  stopsAt: number;
  missing: string;
  onOrder: string;
  short: string;
  /** Some of it is not even on order. */
  isShort: boolean;
  hereOn: string;
  hereOnIso: string;
  cost: string | null;
  /** All that is missing, as a change to try. */
  ifHere: string;
  /** What the figures alone would leave open. */
  note: string | null;
}

/** The parts that stop kits in the order given, worst first, with figures aligned on their points. */
export function stopperRows(page: CheckPageAnswer): StopperRow[] {
  const shortages = new Map(page.answer?.shortages.map((shortage) => [shortage.partNumber, shortage]));
  const parts = new Map(page.parts.map((part) => [part.partNumber, part]));
  const rows = page.stoppers.flatMap((partNumber): StopperRow[] => {
    const shortage = shortages.get(partNumber);
    if (shortage === undefined) return [];
    const part = parts.get(partNumber);
    const decimals = part?.decimals ?? 0;
    return [
      {
        partNumber,
        description: part?.description ?? "",
        supplier: part?.supplier ?? (part?.sourcing === "make" ? "built here" : null),
        unit: unitSymbol(shortage.unit),
        stopsAt: shortage.stopsAt,
        missing: formatQuantity(shortage.missing, decimals),
        onOrder: formatQuantity(shortage.onOrder, decimals),
        short: formatQuantity(shortage.short, decimals),
        isShort: Number(shortage.short) > 0,
        hereOn: formatDate(shortage.readyOn, { today: page.answer?.today, short: true }),
        hereOnIso: shortage.readyOn,
        ifHere: formatIf({ kind: "stock", partNumber, change: `+${shortage.missing}` }),
        note: noteOn(shortage, part),
        cost: part?.cost == null ? null : formatMoney(part.cost),
      },
    ];
  });
  return aligned(rows);
}

/** A part can be missing today though nothing of it has to come: builds under way take its place. */
function noteOn(shortage: Shortage, part: CheckPart | undefined): string | null {
  if (part?.hasLaterOrders) return "more is on order, after the date";
  const comes = Number(shortage.short) > 0 || Number(shortage.onOrder) > 0;
  return comes ? null : "builds under way will cover it";
}

function aligned(rows: StopperRow[]): StopperRow[] {
  const missing = alignOnPoint(rows.map((row) => row.missing));
  const onOrder = alignOnPoint(rows.map((row) => row.onOrder));
  const short = alignOnPoint(rows.map((row) => row.short));
  return rows.map((row, place) => ({
    ...row,
    missing: missing[place],
    onOrder: onOrder[place],
    short: short[place],
  }));
}
