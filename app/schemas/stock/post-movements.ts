import { z } from "zod";
import { isoDate } from "~/schemas/fields/iso-date";
import { moment } from "~/schemas/fields/moment";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity } from "~/schemas/fields/quantity";
import { code, text } from "~/schemas/fields/text";
import { balanceState, postedKind } from "./movement-fields";

const MOST_MOVEMENTS = 500;

const side = z.strictObject({ bin: code("a bin code"), state: balanceState }).nullish();

/** An empty lot is stock without one. */
const lot = z.union([z.string().regex(/^\s*$/), code("a lot code", 80)]);

/** The body of `POST /api/movements`; which sides a kind has is asked by the core. */
export const postMovementsSchema = z.strictObject({
  movements: z
    .array(
      z.strictObject({
        kind: postedKind,
        partNumber,
        quantity: positiveQuantity,
        lot: lot.nullish(),
        from: side,
        to: side,
        happenedAt: moment.nullish(),
        reason: text(500).nullish(),
        reference: text(120).nullish(),
        expiresOn: isoDate.nullish(),
      }),
    )
    .min(1, "Send at least one movement.")
    .max(MOST_MOVEMENTS, `Send at most ${MOST_MOVEMENTS} movements at a time.`),
});

/** The body of `POST /api/movements/:id/reverse`. */
export const reverseMovementSchema = z.strictObject({
  reason: text(500).refine((reason) => reason !== "", "Give the reason of the reversal."),
});
