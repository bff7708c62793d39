import type { ReactNode } from "react";

/** The name of the thing, large, and what it is in a sentence. */
export function PageHead({ name, children }: { name: string; children: ReactNode }) {
  return (
    <>
      <h1 className="figure break-words text-2xl font-semibold sm:text-[2.25rem]">{name}</h1>
      <div className="mt-1 mb-6 max-w-prose text-lg">{children}</div>
    </>
  );
}
