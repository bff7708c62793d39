import type { ReactNode } from "react";
import type { ComponentLine } from "~/schemas/find/part-page";
import type { WhereUsedLine } from "~/schemas/parts/part-answer";
import { formatNumber } from "~/utils/format/format-number";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { type BookColumn, BookTable } from "../book-table";
import { PartLink } from "../part-link";
import { lineConditions } from "./line-conditions";

type Line = WhereUsedLine & { unit: string; conditions: string };

const COLUMNS: BookColumn<Line>[] = [
  { head: "Part", cell: (line) => <PartLink partNumber={line.partNumber} description={line.description} /> },
  { head: "Find number", cell: ({ findNumber }) => <span className="figure">{findNumber ?? "none"}</span> },
  { head: "Counts", cell: ({ conditions }) => conditions || <span className="text-soft">always</span> },
  { head: "In one", isRight: true, cell: takes },
];

function takes({ quantity, unit }: Line): ReactNode {
  if (quantity === null) return "as required";
  return (
    <span className="figure whitespace-nowrap">
      {[formatNumber(quantity), unitSymbol(unit)].filter(Boolean).join(" ")}
    </span>
  );
}

/** The parents that take the part directly. */
export function PartParents({ parents, unit }: { parents: WhereUsedLine[]; unit: string }) {
  return (
    <BookTable
      title="Where it is used"
      columns={COLUMNS}
      rows={parents.map((line) => ({ ...line, unit, conditions: lineConditions(line) }))}
      keyOf={({ partNumber }, at) => `${partNumber} ${at}`}
      empty="No structure takes it."
    />
  );
}

/** What one of the part is made of, one level down. */
export function PartComponents({ components, aside }: { components: ComponentLine[]; aside?: ReactNode }) {
  return (
    <BookTable
      title="What it is made of"
      aside={aside}
      columns={COLUMNS}
      rows={components.map((line) => ({ ...line, conditions: lineConditions(line) }))}
      keyOf={(_, at) => String(at)}
      empty="It is made here, but nobody has said of what: it is planned as if it were bought."
    />
  );
}
