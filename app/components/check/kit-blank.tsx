import type { CheckKit } from "~/schemas/planning/check-answer";

interface KitBlankProps {
  kits: CheckKit[];
  kit: string | null;
  onChange: (kit: string) => void;
}

/** Which kit: a real list, laid unseen over its own words. */
export function KitBlank({ kits, kit, onChange }: KitBlankProps) {
  const chosen = kits.find((one) => one.partNumber === kit);
  return (
    <span className="blank relative inline-flex max-w-full items-baseline gap-x-[0.4em]">
      <span aria-hidden="true" className="figure relative -top-px font-semibold">
        {kit ?? "…"}
      </span>
      {chosen !== undefined && (
        <span aria-hidden="true" className="max-w-[22rem] truncate text-base text-soft max-sm:hidden">
          {chosen.description}
        </span>
      )}
      <svg viewBox="0 0 10 6" aria-hidden="true" className="h-[0.22em] w-[0.36em] self-center" fill="none">
        <path d="M1 1l4 4 4-4" stroke="currentColor" strokeWidth="1.5" />
      </svg>
      <select
        name="kit"
        aria-label="Which kit"
        value={chosen === undefined ? "" : chosen.partNumber}
        onChange={(event) => onChange(event.target.value)}
        className="absolute inset-0 w-full cursor-pointer bg-sheet text-base text-ink opacity-0"
      >
        {chosen === undefined && <option value="">Choose a kit</option>}
        {kits.map((one) => (
          <option key={one.partNumber} value={one.partNumber}>
            {one.partNumber}, {one.description}
          </option>
        ))}
      </select>
    </span>
  );
}
