import type { FileKinds } from "~/schemas/imports/file-kinds";
import { BringIn } from "./bring-in";
import { TakeOut } from "./take-out";

/** Files in and out: the firm's tables as CSV. */
export function FilesPage({ kinds }: { kinds: FileKinds }) {
  return (
    <>
      <h1 className="text-2xl sm:text-[2rem]">Files in and out</h1>
      <p className="mt-1 max-w-prose text-soft">
        The book as CSV: what a file would do is shown first, then it comes in whole or not at all.
      </p>
      <div className="mt-6 grid items-start gap-4 desk:grid-cols-[minmax(0,3fr)_minmax(20rem,1fr)]">
        {kinds.incoming.length > 0 ? (
          <BringIn kinds={kinds.incoming} />
        ) : (
          <p className="sheet max-w-prose">
            Nobody with your role alone brings files in. A planner, a purchaser or the manager can.
          </p>
        )}
        <TakeOut kinds={kinds} />
      </div>
    </>
  );
}
