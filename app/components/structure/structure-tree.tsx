import { type KeyboardEvent, useMemo, useState } from "react";
import { useNavigate } from "react-router";
import type { StructurePlan } from "~/schemas/parts/structure-plan";
import { TreeRows } from "./tree-rows";
import { isMissing, treeShape, visibleRows } from "./visible-rows";

const partPage = (partNumber: string) => `/find/parts/${encodeURIComponent(partNumber)}`;

/** The structure as a tree with its figures: arrows walk and open it, letters jump, Enter opens the part. */
export function StructureTree({ plan }: { plan: StructurePlan }) {
  const { rows, parts } = plan;
  const shape = useMemo(() => treeShape(rows, parts), [rows, parts]);
  const isBranch = (at: number) => shape.end[at] > at + 1;
  const [open, setOpen] = useState<ReadonlySet<number>>(() => new Set([0]));
  const [onlyMissing, setOnlyMissing] = useState(false);
  const [words, setWords] = useState("");
  const [active, setActive] = useState(0);
  const navigate = useNavigate();
  const shown = visibleRows(rows, parts, shape, { open, onlyMissing, words: words.trim() });
  const current = shown.includes(active) ? active : (shown[0] ?? 0);
  const openAll = () => setOpen(new Set(rows.keys()));
  const missing = parts.filter(isMissing).length;

  function setBranch(at: number, isOpen: boolean) {
    const next = new Set(open);
    if (isOpen) next.add(at);
    else next.delete(at);
    setOpen(next);
  }

  function walk(event: KeyboardEvent) {
    const place = shown.indexOf(current);
    const isOpen = open.has(current) && isBranch(current);
    const go = (at: number | undefined) => at !== undefined && setActive(at);
    switch (event.key) {
      case "ArrowDown":
        go(shown[place + 1]);
        break;
      case "ArrowUp":
        go(shown[place - 1]);
        break;
      case "Home":
        go(shown[0]);
        break;
      case "End":
        go(shown.at(-1));
        break;
      case "ArrowRight":
        if (isBranch(current) && !isOpen) setBranch(current, true);
        else if (isOpen) go(shown[place + 1]);
        break;
      case "ArrowLeft":
        if (isOpen) setBranch(current, false);
        else if (shape.parent[current] >= 0) go(shape.parent[current]);
        break;
      case "*": {
        const siblings = [...rows.keys()].filter((at) => shape.parent[at] === shape.parent[current]);
        setOpen(new Set([...open, ...siblings]));
        break;
      }
      case "Enter":
        void navigate(partPage(parts[rows[current].part].partNumber));
        break;
      default: {
        if (!/^[\p{L}\p{N}]$/u.test(event.key) || event.ctrlKey || event.metaKey || event.altKey) return;
        const starts = (at: number) =>
          parts[rows[at].part].partNumber.toLowerCase().startsWith(event.key.toLowerCase());
        go([...shown.slice(place + 1), ...shown.slice(0, place)].find(starts));
      }
    }
    event.preventDefault();
  }

  return (
    <>
      <div className="mt-4 flex flex-wrap items-center gap-x-6 gap-y-2 print:hidden">
        <button type="button" className="min-h-11 underline" onClick={openAll}>
          Open all
        </button>
        <button type="button" className="min-h-11 underline" onClick={() => setOpen(new Set([0]))}>
          Close all
        </button>
        <label className="flex min-h-11 items-center gap-2">
          <input
            type="checkbox"
            checked={onlyMissing}
            onChange={(event) => {
              setOnlyMissing(event.target.checked);
              if (event.target.checked) openAll();
            }}
          />
          Only what leads to the {missing} {missing === 1 ? "part" : "parts"} missing
        </label>
        <label className="flex items-center gap-2">
          <span>Find in it</span>
          <input
            type="search"
            className="field w-48"
            value={words}
            onChange={(event) => setWords(event.target.value)}
          />
        </label>
      </div>
      {shown.length === 0 ? (
        <p className="py-6">
          {onlyMissing ? "Nothing is missing for these kits." : "No part of it has these words. Try fewer."}
        </p>
      ) : (
        <TreeRows
          plan={plan}
          shape={shape}
          shown={shown}
          open={open}
          isWhole={words.trim() !== ""}
          current={current}
          onActive={setActive}
          onBranch={setBranch}
          onWalk={walk}
        />
      )}
    </>
  );
}
