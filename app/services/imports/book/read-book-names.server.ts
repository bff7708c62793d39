import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { Sourcing } from "~/domain/planning/types";

/** What a row needs of the part or supplier it names. */
export interface BookName {
  id: number;
  key: string;
  /** As the book spells it. */
  name: string;
  /** A part's unit, a supplier's currency. */
  unit: string;
}

export interface BookPart extends BookName {
  decimals: number;
  sourcing: Sourcing;
}

function byKey<Name extends BookName>(rows: readonly Name[]): Map<string, Name> {
  return new Map(rows.map((row) => [row.key, row]));
}

/** Every part by its key. */
export async function readPartNames(transaction: Transaction): Promise<Map<string, BookPart>> {
  const statement = "SELECT id, part_key AS `key`, part_number AS name, unit, decimals, sourcing FROM part";
  return byKey(await readRows<BookPart>(statement, {}, transaction));
}

/** Every supplier by its key. */
export async function readSupplierNames(transaction: Transaction): Promise<Map<string, BookName>> {
  const statement = "SELECT id, supplier_key AS `key`, code AS name, currency AS unit FROM supplier";
  return byKey(await readRows<BookName>(statement, {}, transaction));
}
