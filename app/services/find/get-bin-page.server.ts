import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { BinBalance, BinPage } from "~/schemas/find/place-pages";
import { standingOf } from "~/services/parts/sum-part-stock";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { formatDecimals } from "~/utils/format/format-decimals";

interface BalanceRow extends Omit<BinBalance, "standing"> {
  state: string;
  decimals: number;
}

const BALANCES = `
  SELECT part.part_number AS partNumber, part.description, part.unit, part.decimals, balance.state, balance.quantity,
    NULLIF(lot.lot_code, '') AS lot, lot.expires_on AS expiresOn
  FROM balance JOIN part ON part.id = balance.part_id JOIN lot ON lot.id = balance.lot_id
  WHERE balance.bin_id = :id AND balance.quantity <> 0
  ORDER BY part.part_key, lot.lot_code, balance.state`;

/** A bin and what is in it. Throws 404 where there is no such bin. */
export async function getBinPage(code: string): Promise<BinPage> {
  const [bin] = await readRows<{ id: number; code: string; zone: string; description: string }>(
    "SELECT id, code, zone, description FROM bin WHERE bin_key = :key",
    { key: partKey(code) },
  );
  if (!bin) throw new AppError("not-found", `There is no bin ${code}. Check its label or search for it.`);
  const { id, ...named } = bin;
  const day = today();
  const balances = await readRows<BalanceRow>(BALANCES, { id });
  return {
    ...named,
    balances: balances.map(({ state, decimals, ...balance }) => ({
      ...balance,
      quantity: formatDecimals(balance.quantity, decimals),
      standing: standingOf(state, balance.expiresOn, day),
    })),
    today: day,
  };
}
