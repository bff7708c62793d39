import { Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { Supplies } from "~/domain/planning/compile-supplies";
import type { IsoDate } from "~/domain/planning/types";
import { readRevision } from "~/services/revision/read-revision.server";
import type { RevisionName } from "~/services/revision/revision-name";
import { today } from "~/utils/clock";
import type { OpenKitOrder } from "./load-kit-orders.server";
import { loadKitOrders } from "./load-kit-orders.server";
import type { BookStructure } from "./load-structure.server";
import { loadStructure } from "./load-structure.server";
import { loadSupplies, type SupplyRows } from "./load-supplies.server";

/** Everything a plan needs, of one moment. Shared between requests: never changed. */
export interface PlanBook extends BookStructure {
  supplies: Supplies;
  rows: SupplyRows;
  kitOrders: OpenKitOrder[];
  /** Grows with every change of structure, stock or orders. */
  revision: number;
  day: IsoDate;
}

type Revisions = Record<RevisionName, number>;

const NAMES = ["structure", "stock", "orders"] as const;

let kept: { book: PlanBook; revisions: Revisions } | null = null;
let loading: { key: string; book: Promise<PlanBook> } | null = null;

/**
 * The book at its present revision: one indexed query where nothing has changed since the last call,
 * whichever process changed it; else what changed is read again, all in one snapshot.
 */
export async function getPlanBook(): Promise<PlanBook> {
  const revisions = await readRevision(NAMES);
  const day = today();
  if (kept && kept.book.day === day && sameRevisions(kept.revisions, revisions)) return kept.book;
  const key = [day, ...NAMES.map((name) => revisions[name])].join(" ");
  if (loading?.key !== key) loading = { key, book: loadBook(day) };
  const mine = loading;
  try {
    return await mine.book;
  } finally {
    if (loading === mine) loading = null;
  }
}

async function loadBook(day: IsoDate): Promise<PlanBook> {
  const isolationLevel = Transaction.ISOLATION_LEVELS.REPEATABLE_READ;
  return sequelize.transaction({ isolationLevel, readOnly: true }, async (transaction) => {
    const revisions = await readRevision(NAMES, { transaction });
    const last = kept;
    const base =
      last?.revisions.structure === revisions.structure ? last.book : await loadStructure(transaction);
    const { structure, parts, numberOfId, options } = base;
    const { supplies, rows } = await loadSupplies(structure, day, transaction);
    const kitOrders = await loadKitOrders(transaction);
    const revision = revisions.structure + revisions.stock + revisions.orders;
    const book = { structure, parts, numberOfId, options, supplies, rows, kitOrders, revision, day };
    kept = { book, revisions };
    return book;
  });
}

function sameRevisions(a: Revisions, b: Revisions): boolean {
  return NAMES.every((name) => a[name] === b[name]);
}
