import { type ReactNode, useId } from "react";

export interface BookColumn<Row> {
  head: string;
  cell: (row: Row) => ReactNode;
  /** Figures stand on the right. */
  isRight?: boolean;
}

interface BookTableProps<Row> {
  title: string;
  /** A few words beside the title. */
  aside?: ReactNode;
  columns: BookColumn<Row>[];
  rows: Row[];
  keyOf: (row: Row, at: number) => string;
  /** Where an address with a # leads. */
  idOf?: (row: Row, at: number) => string | undefined;
  /** Said instead of the table. */
  empty: ReactNode;
  children?: ReactNode;
}

/** A sheet with a table that is read only. On a narrow page each row becomes a small block. */
export function BookTable<Row>({
  title,
  aside,
  columns,
  rows,
  keyOf,
  idOf,
  empty,
  children,
}: BookTableProps<Row>) {
  const titleId = useId();
  const [first, ...rest] = columns;
  return (
    <section aria-labelledby={titleId} className="sheet min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id={titleId} className="text-lg">
          {title}
        </h2>
        {aside && <p className="text-soft">{aside}</p>}
      </div>
      {rows.length === 0 ? (
        <p className="mt-1 text-soft">{empty}</p>
      ) : (
        <table aria-labelledby={titleId} className="mt-1 w-full max-md:block">
          <thead className="max-md:sr-only">
            <tr className="border-ink border-b-2 text-left align-bottom text-[0.9375rem]">
              {columns.map(({ head, isRight }) => (
                <th
                  key={head}
                  scope="col"
                  className={`py-1.5 pr-4 font-normal last:pr-0 ${isRight ? "text-right" : ""}`}
                >
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody className="max-md:block">
            {rows.map((row, at) => (
              <tr
                key={keyOf(row, at)}
                id={idOf?.(row, at)}
                className="border-line border-b align-top outline-offset-2 last:border-b-0 target:outline-2 target:outline-ink max-md:grid max-md:grid-cols-2 max-md:gap-x-4 max-md:gap-y-1 max-md:py-3"
              >
                <th scope="row" className="text-left font-normal max-md:col-span-2 md:py-1.5 md:pr-4">
                  {first.cell(row)}
                </th>
                {rest.map(({ head, cell, isRight }) => (
                  <td
                    key={head}
                    className={`min-w-0 break-words md:py-1.5 md:pr-4 md:last:pr-0 ${isRight ? "md:text-right" : ""}`}
                  >
                    <span aria-hidden="true" className="block text-[0.9375rem] text-soft md:hidden">
                      {head}
                    </span>
                    {cell(row)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {children}
    </section>
  );
}
