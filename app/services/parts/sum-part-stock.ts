import { formatSteps } from "~/domain/quantity/format-steps";
import { requireSteps } from "~/domain/quantity/parse-steps";
import { addSteps, type Steps, subtractSteps } from "~/domain/quantity/steps";
import type { PartTotals, Standing } from "~/schemas/parts/part-answer";
import { formatDecimals } from "~/utils/format/format-decimals";

/** The database keeps so many decimals of every quantity. */
const STORED_DECIMALS = 6;

interface Stock {
  balances: readonly { standing: Standing; quantity: string }[];
  promised: readonly { quantity: string }[];
  onOrder: readonly { quantity: string }[];
}

/** A balance whose lot expired before the day is of no use, whatever its state says. */
export function standingOf(state: string, expiresOn: string | null, day: string): Standing {
  if (state === "usable" && expiresOn !== null && expiresOn < day) return "expired";
  return state as Standing;
}

/** Sums, exact, written with the part's decimals. */
export function sumPartStock(stock: Stock, decimals: number): PartTotals {
  const standing = (wanted: Standing) => sum(stock.balances.filter((one) => one.standing === wanted));
  const say = (steps: Steps) => formatDecimals(formatSteps(steps, STORED_DECIMALS), decimals);
  const [usable, held, expired, staged] = (["usable", "held", "expired", "staged"] as const).map(standing);
  const promised = sum(stock.promised);
  return {
    onHand: say([held, expired, staged].reduce(addSteps, usable)),
    usable: say(usable),
    held: say(held),
    expired: say(expired),
    staged: say(staged),
    withSupplier: say(standing("with-supplier")),
    promised: say(promised),
    available: say(subtractSteps(usable, promised)),
    onOrder: say(sum(stock.onOrder)),
  };
}

function sum(rows: readonly { quantity: string }[]): Steps {
  return rows.map(({ quantity }) => requireSteps(quantity, STORED_DECIMALS)).reduce<Steps>(addSteps, 0);
}
