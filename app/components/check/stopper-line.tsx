import { Link } from "react-router";
import { KitsCovered } from "./kits-covered";
import type { StopperRow } from "./stopper-rows";

interface StopperLineProps {
  row: StopperRow;
  asked: number;
  seesCosts: boolean;
  /** Where its numbers open to their causes. */
  why: string;
  /** Where the same question is asked as if it were all here. */
  ifHere: string;
}

/** One part that stops kits: a table row at a desk, a small sheet on a phone. */
export function StopperLine({ row, asked, seesCosts, why, ifHere }: StopperLineProps) {
  const unit = row.unit === "" ? "" : `, ${row.unit}`;
  return (
    <tr className="border-line border-b align-top max-lg:grid max-lg:grid-cols-3 sm:max-lg:grid-cols-6 max-lg:gap-x-4 max-lg:gap-y-2 max-lg:py-4">
      <th scope="row" className="text-left font-normal max-lg:col-span-full lg:py-3 lg:pr-4">
        <Link to={why} preventScrollReset className="figure -my-1 inline-block py-1 font-semibold underline">
          {row.partNumber}
        </Link>
        <span className="block text-[0.9375rem] text-soft leading-snug">{row.description}</span>
        {row.supplier !== null && (
          <span className="block text-[0.9375rem] text-soft leading-snug">{row.supplier}</span>
        )}
        <Link
          to={ifHere}
          preventScrollReset
          aria-label={`What if all ${row.partNumber} were here`}
          className="block w-fit text-[0.9375rem] text-soft underline decoration-dotted hover:text-ink print:hidden"
        >
          what if it were here
        </Link>
        {row.note !== null && <span className="block text-[0.9375rem] leading-snug">{row.note}</span>}
      </th>
      <td className="max-lg:col-span-full lg:pt-[1.15rem] lg:pr-4 lg:pb-3">
        <KitsCovered stopsAt={row.stopsAt} asked={asked} />
      </td>
      <Figure label={`Missing${unit}`} value={row.missing} />
      <Figure label={`On order${unit}`} value={row.onOrder} />
      <Figure label={`Short${unit}`} value={row.short} isStop={row.isShort} />
      <td className="text-soft max-lg:sr-only lg:py-3 lg:pr-4">{row.unit === "" ? "each" : row.unit}</td>
      <td className="figure whitespace-nowrap lg:py-3 lg:pr-4 lg:text-right">
        <Label text="Here on" />
        <time dateTime={row.hereOnIso}>{row.hereOn}</time>
      </td>
      {seesCosts && (
        <td className="figure max-lg:col-span-2 lg:py-3 lg:text-right">
          <Label text="Cost" />
          {row.cost ?? <span className="text-soft">no price</span>}
        </td>
      )}
    </tr>
  );
}

function Figure({ label, value, isStop = false }: { label: string; value: string; isStop?: boolean }) {
  return (
    <td className={`figure lg:py-3 lg:pr-4 lg:text-right ${isStop ? "font-semibold text-stop" : ""}`}>
      <Label text={label} />
      {value}
    </td>
  );
}

/** The column's name where the table has come apart into sheets; readers hear it from the header. */
function Label({ text }: { text: string }) {
  return (
    <span aria-hidden="true" className="block font-normal font-sans text-[0.9375rem] text-soft lg:hidden">
      {text}
    </span>
  );
}
