import type { Found, FoundKind } from "~/schemas/find/find-answer";

const ONE_OF: Record<FoundKind, string> = {
  part: "part",
  bin: "bin",
  lot: "lot",
  supplier: "supplier",
  "purchase-order": "purchase order",
  "shop-order": "shop order",
  "kit-order": "kit order",
};

interface FoundListProps {
  id: string;
  found: (Found & { kind: FoundKind })[];
  /** Place of the one that Enter would open; -1 for none. */
  active: number;
  onChoose: (address: string) => void;
}

/** What was found so far, under the box. The keyboard stays in the box and walks it from there. */
export function FoundList({ id, found, active, onChoose }: FoundListProps) {
  return (
    <div
      id={id}
      role="listbox"
      aria-label="Found so far"
      hidden={found.length === 0}
      className="absolute top-full right-0 z-30 w-[26rem] max-w-[calc(100vw-2rem)] border border-edge bg-sheet"
    >
      {found.map(({ kind, name, words, to }, at) => (
        // biome-ignore lint/a11y/useFocusableInteractive: the box keeps the focus and names the active one.
        // biome-ignore lint/a11y/useKeyWithClickEvents: the box hears the keys.
        <div
          key={`${kind} ${to}`}
          id={`${id}-${at}`}
          role="option"
          aria-selected={at === active}
          className={`cursor-pointer border-line border-b px-3 py-2 last:border-b-0 ${at === active ? "bg-ink text-paper" : "hover:bg-paper"}`}
          onMouseDown={(event) => event.preventDefault()}
          onClick={() => onChoose(to)}
        >
          <span className="flex items-baseline justify-between gap-4">
            <span className="figure min-w-0 break-words font-semibold">{name}</span>
            <span className={`shrink-0 text-[0.9375rem] ${at === active ? "" : "text-soft"}`}>
              {ONE_OF[kind]}
            </span>
          </span>
          {words && <span className="block truncate text-[0.9375rem]">{words}</span>}
        </div>
      ))}
    </div>
  );
}
