import type { ChainLink } from "~/domain/planning/types";

interface ChainBarProps {
  /** Days from today. */
  from: number;
  to: number;
  whole: number;
  why: ChainLink["why"];
}

/** A stretch of time between today and the day all is ready: full for work here, hollow for waiting on others. */
export function ChainBar({ from, to, whole, why }: ChainBarProps) {
  const start = Math.max(0, Math.min(from, to));
  const x = `${(start / whole) * 100}%`;
  const width = `${Math.max(((to - start) / whole) * 100, 0.8)}%`;
  return (
    <svg
      height="14"
      aria-hidden="true"
      focusable="false"
      className="col-span-2 row-start-2 w-full overflow-visible sm:col-span-1 sm:col-start-2 sm:row-start-1"
    >
      <line x1="0" x2="100%" y1="7" y2="7" strokeWidth="1" className="stroke-line" />
      {why === "build" ? (
        <rect x={x} width={width} y="1" height="12" className="fill-ink" />
      ) : (
        <rect x={x} width={width} y="2" height="10" strokeWidth="2" className="fill-stop-wash stroke-stop" />
      )}
    </svg>
  );
}
