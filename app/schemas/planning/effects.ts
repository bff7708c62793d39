import { z } from "zod";
import type { IsoDate } from "~/domain/planning/types";
import { isoDate } from "~/schemas/fields/iso-date";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity } from "~/schemas/fields/quantity";
import { code } from "~/schemas/fields/text";
import { structureKind } from "~/schemas/imports/structure";
import { kitOrderSchema } from "~/schemas/kit-orders/kit-order";
import type { ShipLineAnswer } from "./ship-line";
import { cells, csvRow, optionalDate, partChange, signedQuantity } from "./what-if";

const MOST_ENTRIES = 500;
const MOST_LINES = 2000;

const list = <Entry extends z.ZodType>(entry: Entry) => z.array(entry).max(MOST_ENTRIES).default([]);
/** Null leaves it open; `""` is stock without a lot. */
const lot = z.union([z.string().trim().max(120), z.null()]).default(null);
const reference = code("an order's number");
const anyPart = z.union([partNumber, z.null()]).default(null);
const emptyIsNull = <Field extends z.ZodType>(field: Field) =>
  z.union([z.literal("").transform(() => null), z.null(), field]);

const stockChange = z.strictObject({
  partNumber,
  /** Stock counts for kits in whatever bin it lies. */
  bin: z.union([z.string().trim().max(64), z.null()]).default(null),
  lot,
  state: z.enum(["usable", "held", "staged", "with-supplier"]).default("usable"),
  change: signedQuantity,
  expiresOn: optionalDate,
});

const supplyChange = z.strictObject({
  add: list(
    z.strictObject({
      partNumber,
      quantity: positiveQuantity,
      due: optionalDate,
      reference: z.union([reference, z.null()]).default(null),
    }),
  ),
  move: list(z.strictObject({ reference, partNumber: anyPart, due: optionalDate })),
  remove: list(z.strictObject({ reference, partNumber: anyPart })),
});

/** All lines of the parent, in place of those it has; none where it is to have no structure. */
const structureChange = z
  .strictObject({ parent: partNumber, lines: z.array(cells).max(MOST_LINES) })
  .transform(({ parent, lines }) => ({
    parent,
    lines: lines.map((line): z.input<typeof cells> => ({ ...line, parent })),
  }))
  .pipe(z.object({ parent: z.string(), lines: z.array(csvRow(structureKind)) }));

const { number, kit, options, serial, wantedOn, priority } = kitOrderSchema.shape;

const kitOrderChange = z.strictObject({
  add: list(z.strictObject({ number, kit, options, serial, wantedOn, priority })),
  /** What is left out stays as it is; another priority or date moves the order in the queue. */
  change: list(
    z.strictObject({
      number: reference,
      kit: kit.optional(),
      options: options.unwrap().optional(),
      serial: emptyIsNull(z.string().trim().max(60)).optional(),
      wantedOn: emptyIsNull(isoDate).optional(),
      priority: priority.optional(),
    }),
  ),
  cancel: list(reference),
});

/** What an act would change, whichever form it comes from. Everything may be left out. */
const bookChange = z.strictObject({
  stock: list(stockChange),
  /** Every usable piece of the lot becomes held; every held piece usable. */
  hold: list(z.strictObject({ partNumber, lot })),
  release: list(z.strictObject({ partNumber, lot })),
  supply: supplyChange.prefault({}),
  parts: list(partChange),
  structure: list(structureChange),
  kitOrders: kitOrderChange.prefault({}),
});

/** The body of `POST /api/effects`. */
export const effectsQuestionSchema = z.strictObject({ change: bookChange });

/** A change as a form sends it. */
export type BookChangeInput = z.input<typeof bookChange>;

/** A change with everything in it that was left out. */
export type BookChange = z.output<typeof bookChange>;

/** The ship line at one moment, as `GET /api/ship-line` says it. */
export type ShipLineState = Omit<ShipLineAnswer, "revision">;

type Stoppers = NonNullable<ShipLineAnswer["next"]>["stoppers"];

/** An open kit order in the order of service. `stoppers` is what it waits for after all before it are served. */
export interface PlannedKitOrder {
  kitOrder: string;
  partNumber: string;
  isReady: boolean;
  stoppers: Stoppers;
  readyOn: IsoDate;
}

/** An order that the change enters, or speaks of and alters. `planned` is null far down the queue. */
export interface OwnKitOrder {
  kitOrder: string;
  /** From 1. */
  place: number;
  planned: PlannedKitOrder | null;
}

/** The answer of `POST /api/effects`. */
export interface EffectsAnswer {
  today: IsoDate;
  revision: number;
  before: ShipLineState;
  after: ShipLineState;
  /** Orders of the ship line that were not ready and would be. */
  becomeReady: string[];
  /** Orders of the ship line that were ready and would no longer be. */
  stop: PlannedKitOrder[];
  own: OwnKitOrder[];
}
