import type { SupplierPage as SupplierPageAnswer } from "~/schemas/find/place-pages";
import { FactList } from "../fact-list";
import { OfferTable } from "../offer-table";
import { OrderLines } from "./order-lines";
import { PageHead } from "./page-head";

/** A supplier: how to reach it, what it offers, what is still to come. */
export function SupplierPage({ supplier }: { supplier: SupplierPageAnswer }) {
  const { code, name, email, phone, currency, leadTimeDays, note, offers, lines, seesCosts, today } =
    supplier;
  return (
    <>
      <PageHead name={code}>
        <p>{name}</p>
        {note && <p className="text-base text-soft">{note}</p>}
      </PageHead>
      <div className="grid gap-4">
        <section aria-labelledby="reach-title" className="sheet max-w-2xl">
          <h2 id="reach-title" className="text-lg">
            How to reach them
          </h2>
          <FactList
            facts={[
              {
                name: "E-mail",
                value: email ? (
                  <a className="underline" href={`mailto:${email}`}>
                    {email}
                  </a>
                ) : (
                  "not said"
                ),
              },
              { name: "Telephone", value: phone ? <span className="figure">{phone}</span> : "not said" },
              { name: "Currency", value: currency },
              { name: "Usual lead time", value: leadTimeDays === null ? "not said" : `${leadTimeDays} days` },
            ]}
          />
        </section>
        <OrderLines
          title="Still to come"
          lines={lines}
          namesOrder
          seesCosts={seesCosts}
          today={today}
          empty="Nothing is on order with them."
        />
        <OfferTable offers={offers} first="part" seesCosts={seesCosts} />
      </div>
    </>
  );
}
