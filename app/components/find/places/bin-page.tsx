import type { BinBalance, BinPage as BinPageAnswer } from "~/schemas/find/place-pages";
import { formatDate } from "~/utils/format/format-date";
import { type BookColumn, BookTable } from "../book-table";
import { HeldCaution } from "../held-caution";
import { PartLink } from "../part-link";
import { StandingMark } from "../standing-mark";
import { PageHead } from "./page-head";
import { QuantityCell } from "./quantity-cell";

const COLUMNS: BookColumn<BinBalance & { today: string }>[] = [
  { head: "Part", cell: (row) => <PartLink partNumber={row.partNumber} description={row.description} /> },
  { head: "Lot", cell: ({ lot }) => <span className="figure">{lot ?? "none"}</span> },
  { head: "State", cell: ({ standing }) => <StandingMark standing={standing} /> },
  {
    head: "Use by",
    cell: ({ expiresOn, today }) =>
      expiresOn === null ? (
        <span className="text-soft">no date</span>
      ) : (
        <span className="figure whitespace-nowrap">{formatDate(expiresOn, { today, short: true })}</span>
      ),
  },
  { head: "Quantity", isRight: true, cell: (row) => <QuantityCell {...row} /> },
];

/** A bin and what is in it. */
export function BinPage({ bin }: { bin: BinPageAnswer }) {
  const { balances, today } = bin;
  return (
    <>
      <PageHead name={bin.code}>
        <p>{["Bin", bin.zone, bin.description].filter(Boolean).join(", ")}.</p>
      </PageHead>
      <BookTable
        title="In this bin"
        columns={COLUMNS}
        rows={balances.map((balance) => ({ ...balance, today }))}
        keyOf={({ partNumber, lot, standing }) => [partNumber, lot, standing].join("\n")}
        empty="The book has nothing in this bin."
      >
        {balances.some(({ standing }) => standing === "held" || standing === "expired") && <HeldCaution />}
      </BookTable>
    </>
  );
}
