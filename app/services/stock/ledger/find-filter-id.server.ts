import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import { AppError } from "~/utils/errors";

const TABLES = {
  partNumber: { select: "SELECT id FROM part WHERE part_key = :key", noun: "part" },
  bin: { select: "SELECT id FROM bin WHERE bin_key = :key", noun: "bin" },
};

/** The id of the part or bin that a list is asked for; null where it is asked for all. @throws AppError "not-found" */
export async function findFilterId(
  field: keyof typeof TABLES,
  code: string | undefined,
): Promise<number | null> {
  if (code === undefined) return null;
  const { select, noun } = TABLES[field];
  const [row] = await readRows<{ id: number }>(select, { key: partKey(code) });
  if (row) return row.id;
  const message = `There is no ${noun} ${code}. Check it or search for it.`;
  throw new AppError("not-found", message, { errors: [{ field, value: code, message }] });
}
