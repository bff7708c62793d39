import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { compileStructure } from "~/domain/planning/compile-structure";
import { partKey } from "~/domain/planning/part-key";
import type { PartRow } from "~/schemas/imports/parts";
import type { RecordChange, StoredRecord } from "~/services/imports/decide/decide-records";
import { readBookLines } from "./read-book-lines.server";

interface PartProblem {
  column: "decimals" | "sourcing";
  expected: string;
}

type Stored = ReadonlyMap<string, StoredRecord<PartRow>>;

const finerQuantities = `SELECT component_id AS partId, quantity FROM structure_line WHERE component_id IN (:ids)
  UNION ALL SELECT part_id, quantity FROM movement_leg WHERE part_id IN (:ids)
  UNION ALL SELECT part_id, quantity FROM purchase_order_line WHERE part_id IN (:ids)
  UNION ALL SELECT part_id, quantity FROM shop_order WHERE part_id IN (:ids)`;

/** Fewer decimals must still hold every quantity that is written down of the part. */
async function checkFewerDecimals(
  changes: readonly RecordChange<PartRow>[],
  stored: Stored,
  transaction: Transaction,
) {
  const fewer = changes.filter((change) => {
    const before = stored.get(partKey(change.value.partNumber));
    return before !== undefined && change.value.decimals < before.value.decimals;
  });
  if (fewer.length === 0) return [];
  const partById = new Map(fewer.map((change) => [change.id, change.value]));
  const ids = [...partById.keys()];
  const rows = await readRows<{ partId: number; quantity: string | null }>(
    finerQuantities,
    { ids },
    transaction,
  );
  const needed = new Map<number, number>();
  for (const { partId, quantity } of rows) {
    const decimals = quantity?.split(".")[1]?.replace(/0+$/, "").length ?? 0;
    needed.set(partId, Math.max(decimals, needed.get(partId) ?? 0));
  }
  return [...partById].flatMap(([id, part]) => {
    const least = needed.get(id ?? 0) ?? 0;
    if (least <= part.decimals) return [];
    const expected = `at least ${least}, since quantities of ${part.partNumber} with ${least} decimals are in the book`;
    return [{ part, problem: { column: "decimals", expected } as const }];
  });
}

/** Another sourcing must leave options and effectivity standing where they may. */
async function checkSourcing(
  changes: readonly RecordChange<PartRow>[],
  stored: Stored,
  transaction: Transaction,
) {
  const resourced = changes.filter(({ value }) => {
    const before = stored.get(partKey(value.partNumber));
    return before !== undefined && before.value.sourcing !== value.sourcing;
  });
  if (resourced.length === 0) return [];
  const parts = new Map([...stored].map(([key, record]) => [key, record.value]));
  for (const { value } of changes) parts.set(partKey(value.partNumber), value);
  const lines = await readBookLines(transaction);
  const compiled = compileStructure([...parts.values()], lines);
  if (compiled.ok) return [];
  const [problem] = compiled.problems;
  const where =
    "line" in problem ? `${lines[problem.line].parent} > ${lines[problem.line].component}` : "a line";
  const expected = `the sourcing that it had, since the option or effectivity on ${where} could not stand otherwise`;
  return resourced.map(({ value }) => ({ part: value, problem: { column: "sourcing", expected } as const }));
}

/** What stands in the way of changed parts beside the rest of the book, by part key. */
export async function checkChangedParts(
  changes: readonly RecordChange<PartRow>[],
  stored: Stored,
  transaction: Transaction,
): Promise<Map<string, PartProblem[]>> {
  const found = [
    ...(await checkFewerDecimals(changes, stored, transaction)),
    ...(await checkSourcing(changes, stored, transaction)),
  ];
  const problems = new Map<string, PartProblem[]>();
  for (const { part, problem } of found) {
    const key = partKey(part.partNumber);
    problems.set(key, [...(problems.get(key) ?? []), problem]);
  }
  return problems;
}
