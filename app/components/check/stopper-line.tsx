import { KitsCovered } from "./kits-covered";
import type { StopperRow } from "./stopper-rows";

interface StopperLineProps {
  row: StopperRow;
  asked: number;
  seesCosts: boolean;
}

/** One part that stops kits: a table row at a desk, a small sheet on a phone. */
export function StopperLine({ row, asked, seesCosts }: StopperLineProps) {
  return (
    <tr className="border-line border-b align-top max-md:grid max-md:grid-cols-3 max-md:gap-x-4 max-md:gap-y-2 max-md:py-4">
      <th scope="row" className="text-left font-normal max-md:col-span-3 md:py-3 md:pr-4">
        <span className="figure block font-semibold">{row.partNumber}</span>
        <span className="block text-[0.9375rem] text-soft leading-snug">{row.description}</span>
        {row.supplier !== null && (
          <span className="block text-[0.9375rem] text-soft leading-snug">{row.supplier}</span>
        )}
      </th>
      <td className="max-md:col-span-3 md:pt-[1.15rem] md:pr-4 md:pb-3">
        <KitsCovered stopsAt={row.stopsAt} asked={asked} />
      </td>
      <Figure label="Missing" value={row.missing} />
      <Figure label="On order" value={row.onOrder} />
      <Figure label="Short" value={row.short} isStop={row.isShort} />
      <td className="text-soft max-md:sr-only md:py-3 md:pr-4">{row.unit === "" ? "each" : row.unit}</td>
      <td className="figure whitespace-nowrap md:py-3 md:pr-4 md:text-right">
        <Label text="Here on" />
        <time dateTime={row.hereOnIso}>{row.hereOn}</time>
      </td>
      {seesCosts && (
        <td className="figure max-md:col-span-2 md:py-3 md:text-right">
          <Label text="Cost" />
          {row.cost ?? <span className="text-soft">no price</span>}
        </td>
      )}
    </tr>
  );
}

function Figure({ label, value, isStop = false }: { label: string; value: string; isStop?: boolean }) {
  return (
    <td className={`figure md:py-3 md:pr-4 md:text-right ${isStop ? "font-semibold text-stop" : ""}`}>
      <Label text={label} />
      {value}
    </td>
  );
}

/** The column's name where the table has come apart into sheets; readers hear it from the header. */
function Label({ text }: { text: string }) {
  return (
    <span aria-hidden="true" className="block font-normal font-sans text-[0.9375rem] text-soft md:hidden">
      {text}
    </span>
  );
}
