import { useQuery } from "@tanstack/react-query";
import { effectsQuery } from "~/hooks/queries/effects";
import { useSettled } from "~/hooks/use-settled";
import type { BookChangeInput } from "~/schemas/planning/effects";
import { type EffectShape, type EffectWord, effectWords } from "./effect-words";

const TYPING_PAUSE = 120;

interface EffectLineProps {
  /** What the form would change as it stands; null while it cannot be said yet. */
  change: BookChangeInput | null;
  /** What stands there instead while the change cannot be said. */
  waiting: string;
  className?: string;
}

/** Above a form's button: what the act would do to the ship line, as one types. Its height stays. */
export function EffectLine({ change, waiting, className = "" }: EffectLineProps) {
  const settled = useSettled(JSON.stringify(change), TYPING_PAUSE);
  const { data, error, isFetching } = useQuery(effectsQuery(JSON.parse(settled)));
  const said = data && effectWords(data);
  const words =
    change === null ? waiting : (error?.message ?? said?.words.map(say) ?? "Asking what this does …");
  const shape = change === null || error !== null ? undefined : said?.shape;
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset holds fields.
    <div
      role="group"
      aria-label="What this does to the ship line"
      aria-busy={isFetching}
      className={`flex min-h-28 gap-3 border-line border-t pt-3 sm:min-h-16 ${className}`}
    >
      <Shape shape={shape ?? "same"} isFaint={shape === undefined} />
      <p aria-live="polite" className={shape === undefined ? "text-soft" : ""}>
        {words}
      </p>
    </div>
  );
}

function say({ text, stops, figure }: EffectWord, at: number) {
  const look = [
    figure && "figure inline-block max-w-full text-[0.94em] wrap-anywhere",
    stops && "font-bold text-stop",
  ]
    .filter(Boolean)
    .join(" ");
  return look === "" ? (
    text
  ) : (
    <span key={at} className={look}>
      {text}
    </span>
  );
}

/** Level for no change, a cross for a stop, an upward point for ready, two arrows for what only moves. */
const SHAPES: Record<EffectShape, string> = {
  same: "M2 6h12 M2 10h12",
  stops: "M3 3l10 10 M13 3L3 13",
  helps: "M8 13V3 M3.5 7.5L8 3l4.5 4.5",
  moves: "M2 5.5h11 M10 2.5l3 3-3 3 M14 11H3 M6 8l-3 3 3 3",
};

function Shape({ shape, isFaint }: { shape: EffectShape; isFaint: boolean }) {
  const colour = isFaint ? "text-edge" : shape === "stops" ? "text-stop" : "";
  return (
    <svg
      viewBox="0 0 16 16"
      aria-hidden="true"
      className={`mt-1 size-4 shrink-0 ${colour}`}
      fill="none"
      stroke="currentColor"
    >
      <path d={SHAPES[shape]} strokeWidth="2" />
    </svg>
  );
}
