import { type FormEvent, useId } from "react";
import type { Incoming } from "~/hooks/use-file-import";

interface HeaderMatchProps {
  file: Incoming;
  /** Headers of the file that are none of ours. */
  unknown: readonly string[];
  columns: readonly string[];
  onTry: (file: Incoming) => void;
}

/** Says by hand which column each unknown header is; it is remembered once the file is in. */
export function HeaderMatch({ file, unknown, columns, onTry }: HeaderMatchProps) {
  const id = useId();

  function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const chosen = new FormData(event.currentTarget);
    const matched = unknown.map((header, place) => [header, String(chosen.get(`header-${place}`))] as const);
    onTry({ ...file, headers: { ...file.headers, ...Object.fromEntries(matched) } });
  }

  return (
    <form onSubmit={submit} className="mt-4 max-w-3xl">
      <h3 className="text-lg">Match the headers by hand</h3>
      <p className="text-[0.9375rem] text-soft">It is remembered for the next file of this kind.</p>
      <div className="mt-2 grid gap-2">
        {unknown.map((header, place) => (
          <div key={header} className="grid items-center gap-x-4 sm:grid-cols-2">
            <label htmlFor={`${id}-${place}`} className="figure break-words">
              {header}
            </label>
            <select
              id={`${id}-${place}`}
              name={`header-${place}`}
              className="field"
              defaultValue={closest(header, columns)}
            >
              <option value="">leave this column out</option>
              {columns.map((column) => (
                <option key={column}>{column}</option>
              ))}
            </select>
          </div>
        ))}
      </div>
      <button type="submit" className="button mt-3">
        See what it would do
      </button>
    </form>
  );
}

/** The column whose name has the same letters, so that `Part Number` needs no choosing. */
function closest(header: string, columns: readonly string[]): string {
  const letters = (text: string) => text.toLowerCase().replaceAll(/[^a-z0-9]/g, "");
  return columns.find((column) => letters(column) === letters(header)) ?? "";
}
