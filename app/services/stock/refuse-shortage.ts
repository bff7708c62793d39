import { formatStored } from "~/domain/stock/format-stored";
import { AppError, type FieldError } from "~/utils/errors";
import type { RefusedDraft } from "./append-movements.server";

/** What the words of a refusal need. */
export interface RefusedStock {
  refused: RefusedDraft;
  partNumber: string;
  decimals: number;
  unit: string;
  bin: string;
  lotCode: string;
}

/** The conflict of movements that there is not enough stock for, with a sentence for each. */
export function refuseShortage(stocks: readonly RefusedStock[]): AppError {
  const errors = stocks.map(
    (stock): FieldError => ({
      line: stock.refused.draft + 1,
      field: "quantity",
      message: sentenceFor(stock),
    }),
  );
  const more = errors.length > 1 ? ` And ${errors.length - 1} more.` : "";
  return new AppError("conflict", `${errors[0].message}${more} Nothing was posted.`, { errors });
}

function sentenceFor({ refused, partNumber, decimals, unit, bin, lotCode }: RefusedStock): string {
  const where = `${partNumber} in bin ${bin}${lotCode ? `, lot ${lotCode}` : ""} (${refused.at.state})`;
  const onHand = `${formatStored(refused.onHand, decimals)} ${unit} on hand`;
  const size = refused.at.quantity < 0n ? -refused.at.quantity : refused.at.quantity;
  const asked = `${formatStored(size, decimals)} ${unit}`;
  return refused.code === "not-enough"
    ? `${where}: ${onHand}, not enough to take ${asked}.`
    : `${where}: ${onHand}, too much to add ${asked}.`;
}
