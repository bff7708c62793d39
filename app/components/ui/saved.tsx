import type { ReactNode } from "react";

/** Says that an act is done. */
export function Saved({ children }: { children: ReactNode }) {
  return (
    <p role="status" className="mb-6 flex max-w-prose gap-3 border-ink border-l-4 bg-sheet px-4 py-3">
      <svg
        viewBox="0 0 16 16"
        aria-hidden="true"
        className="mt-1 size-4 shrink-0"
        fill="none"
        stroke="currentColor"
      >
        <path d="M2 8.5l4 4 8-9" strokeWidth="2" />
      </svg>
      {children}
    </p>
  );
}
