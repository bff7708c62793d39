import { useVirtualizer } from "@tanstack/react-virtual";
import { type KeyboardEvent, useEffect, useRef } from "react";
import type { StructurePlan } from "~/schemas/parts/structure-plan";
import { TreeRow } from "./tree-row";
import type { TreeShape } from "./visible-rows";

interface TreeRowsProps {
  plan: StructurePlan;
  shape: TreeShape;
  /** Indexes of the rows to draw. */
  shown: readonly number[];
  open: ReadonlySet<number>;
  /** Every branch is open, since words are looked for. */
  isWhole: boolean;
  current: number;
  onActive: (at: number) => void;
  onBranch: (at: number, isOpen: boolean) => void;
  onWalk: (event: KeyboardEvent) => void;
}

const ROW_HEIGHT = 44;
/** What the server sends, before the page knows its size. */
const FIRST_ROWS = 60;

const HEADS = ["Part", "For one", "Needed", "From stock", "To build", "Missing"];

/** Only the rows in sight are drawn, so a tree of thousands opens at once. */
export function TreeRows({
  plan,
  shape,
  shown,
  open,
  isWhole,
  current,
  onActive,
  onBranch,
  onWalk,
}: TreeRowsProps) {
  const box = useRef<HTMLDivElement>(null);
  const virtual = useVirtualizer({
    count: shown.length,
    getScrollElement: () => box.current,
    estimateSize: () => ROW_HEIGHT,
    getItemKey: (place) => shown[place],
    overscan: 12,
  });
  const items = virtual.getVirtualItems();
  const place = shown.indexOf(current);
  const hasFocus = useRef(false);

  // biome-ignore lint/correctness/useExhaustiveDependencies: the row that the keys reach comes into sight and takes the focus
  useEffect(() => {
    if (!hasFocus.current || place < 0) return;
    virtual.scrollToIndex(place);
    const timer = requestAnimationFrame(() =>
      box.current?.querySelector<HTMLElement>(`[data-row="${current}"]`)?.focus({ preventScroll: true }),
    );
    return () => cancelAnimationFrame(timer);
  }, [current, shown.length]);

  const drawn = items.length > 0 ? items.map(({ index }) => index) : [...shown.keys()].slice(0, FIRST_ROWS);
  const before = items[0]?.start ?? 0;
  const after = items.length > 0 ? virtual.getTotalSize() - (items.at(-1)?.end ?? 0) : 0;
  return (
    <div
      ref={box}
      role="treegrid"
      aria-label={`Structure of ${plan.partNumber}`}
      aria-rowcount={shown.length + 1}
      tabIndex={-1}
      className="mt-3 max-h-[calc(100dvh-9rem)] overflow-y-auto border border-line bg-sheet outline-none print:max-h-none print:overflow-visible"
      onKeyDown={onWalk}
      onFocus={() => {
        hasFocus.current = true;
      }}
      onBlur={(event) => {
        hasFocus.current = event.currentTarget.contains(event.relatedTarget);
      }}
    >
      <div
        role="row"
        aria-rowindex={1}
        className="structure-row sticky top-0 z-10 border-ink border-b-2 bg-sheet text-[0.9375rem] max-md:hidden"
      >
        {HEADS.map((head) => (
          <span key={head} role="columnheader" className={head === "Part" ? "" : "text-right"}>
            {head}
          </span>
        ))}
      </div>
      {before > 0 && <div style={{ height: before }} />}
      {drawn.map((at) => (
        <TreeRow
          key={shown[at]}
          plan={plan}
          at={shown[at]}
          place={at}
          measure={virtual.measureElement}
          isBranch={shape.end[shown[at]] > shown[at] + 1}
          isOpen={isWhole || open.has(shown[at])}
          isCurrent={shown[at] === current}
          onActive={onActive}
          onBranch={onBranch}
        />
      ))}
      {after > 0 && <div style={{ height: after }} />}
    </div>
  );
}
