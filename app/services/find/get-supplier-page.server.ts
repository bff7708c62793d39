import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { SupplierPage } from "~/schemas/find/place-pages";
import { getOffers } from "~/services/parts/get-offers.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { readOrderLines } from "./read-order-lines.server";

type SupplierRow = Omit<SupplierPage, "offers" | "lines" | "seesCosts" | "today"> & { id: number };

/** A supplier, what it offers and what is still to come from it. Throws 404 where there is no such supplier. */
export async function getSupplierPage(code: string, person: CurrentPerson): Promise<SupplierPage> {
  const key = partKey(code);
  const [supplier] = await readRows<SupplierRow>(
    `SELECT id, code, name, email, phone, currency, lead_time_days AS leadTimeDays, note
    FROM supplier WHERE supplier_key = :key`,
    { key },
  );
  if (!supplier)
    throw new AppError("not-found", `There is no supplier ${code}. Search for a word of its name.`);
  const { id, ...named } = supplier;
  const seesCosts = mayDo(person.roles, "see-costs");
  const [offers, lines] = await Promise.all([
    getOffers({ supplier: key }, seesCosts),
    readOrderLines({ supplier: id }, seesCosts),
  ]);
  return { ...named, offers, lines, seesCosts, today: today() };
}
