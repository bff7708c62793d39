import type { FileKinds } from "~/schemas/imports/file-kinds";
import { KIND_WORDS } from "./kind-words";

/** Every table of the book to download. */
export function TakeOut({ kinds: { outgoing, mayTakeBook } }: { kinds: FileKinds }) {
  return (
    <section className="sheet" aria-labelledby="take-out">
      <h2 id="take-out" className="text-lg">
        Take a file out
      </h2>
      <p className="mt-1 text-[0.9375rem] text-soft">
        As it is imported. Text that a spreadsheet would run as a formula has an apostrophe before it.
      </p>
      <ul className="mt-3">
        {outgoing.map((name) => (
          <li key={name} className="border-line border-t">
            <a href={`/api/exports/${name}`} download className="flex min-h-11 items-center underline">
              All {KIND_WORDS[name].name}
            </a>
          </li>
        ))}
        {mayTakeBook && (
          <li className="border-ink border-t-2">
            <a href="/api/exports/book" download className="flex min-h-11 items-center font-bold underline">
              Everything, as one archive
            </a>
          </li>
        )}
      </ul>
    </section>
  );
}
