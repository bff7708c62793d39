import { useRef } from "react";
import { useCloseDetails } from "~/hooks/use-close-details";
import type { CheckKit } from "~/schemas/planning/check-answer";

interface OptionsBlankProps {
  options: CheckKit["options"];
  chosen: string[];
  onChange: (codes: string[]) => void;
}

/** With which options: opens to a list to tick. */
export function OptionsBlank({ options, chosen, onChange }: OptionsBlankProps) {
  const list = useRef<HTMLDetailsElement>(null);
  useCloseDetails(list);

  function tick(code: string, isOn: boolean) {
    const codes = options.map((option) => option.code);
    onChange(codes.filter((one) => (one === code ? isOn : chosen.includes(one))));
  }

  return (
    <details ref={list} className="relative">
      <summary className="blank">
        <span className="sr-only">Options: </span>
        {chosen.length === 0 ? (
          <span className="font-bold">no options</span>
        ) : (
          <span className="figure font-semibold">{chosen.join(" + ")}</span>
        )}
      </summary>
      <fieldset className="absolute top-full left-0 z-20 mt-1 w-max max-w-[80vw] border border-edge bg-sheet px-4 py-3 text-base max-sm:fixed max-sm:inset-x-4 max-sm:top-auto max-sm:w-auto max-sm:max-w-none">
        <legend className="sr-only">Options of the kit</legend>
        {options.map((option) => (
          <label key={option.code} className="flex min-h-9 items-center gap-3">
            <input
              type="checkbox"
              name="options"
              value={option.code}
              checked={chosen.includes(option.code)}
              onChange={(event) => tick(option.code, event.target.checked)}
              className="size-4 shrink-0"
            />
            <span>
              <span className="figure font-semibold">{option.code}</span> {option.description}
            </span>
          </label>
        ))}
      </fieldset>
    </details>
  );
}
