import { readRows } from "~/db/read-rows.server";
import type { PresentedOffer } from "~/schemas/find/part-page";
import { formatDecimals } from "~/utils/format/format-decimals";
import { trimDecimal } from "~/utils/format/trim-decimal";

interface OfferRow extends Omit<PresentedOffer, "preferred"> {
  decimals: number;
  preferred: number;
}

const OFFERS = `
  SELECT supplier.code AS supplier, supplier.name AS supplierName, part.part_number AS partNumber, part.description,
    part.unit, part.decimals, offer.supplier_part_number AS supplierPartNumber, offer.buying_unit AS buyingUnit,
    offer.per_buying_unit AS perBuyingUnit, offer.minimum, offer.multiple, offer.from_quantity AS fromQuantity,
    offer.unit_price AS unitPrice, offer.currency,
    COALESCE(offer.lead_time_days, supplier.lead_time_days) AS leadTimeDays, offer.preferred
  FROM offer JOIN supplier ON supplier.id = offer.supplier_id JOIN part ON part.id = offer.part_id`;

/** The offers of one part, the preferred supplier first, or of one supplier, by part number. */
export async function getOffers(of: { part: string } | { supplier: string }, seesCosts: boolean) {
  const rows =
    "part" in of
      ? await readRows<OfferRow>(
          `${OFFERS} WHERE part.part_key = :key ORDER BY offer.preferred DESC, supplier.name, offer.from_quantity`,
          { key: of.part },
        )
      : await readRows<OfferRow>(
          `${OFFERS} WHERE supplier.supplier_key = :key ORDER BY part.part_key, offer.from_quantity`,
          { key: of.supplier },
        );
  return rows.map((row) => presentOffer(row, seesCosts));
}

function presentOffer({ decimals, ...row }: OfferRow, seesCosts: boolean): PresentedOffer {
  return {
    ...row,
    perBuyingUnit: formatDecimals(row.perBuyingUnit, decimals),
    minimum: row.minimum === null ? null : trimDecimal(row.minimum),
    multiple: row.multiple === null ? null : trimDecimal(row.multiple),
    fromQuantity: trimDecimal(row.fromQuantity),
    unitPrice: seesCosts && row.unitPrice !== null ? trimDecimal(row.unitPrice) : null,
    preferred: Boolean(row.preferred),
  };
}
