import { useEffect, useState } from "react";
import { MOST_KITS, readKitCount } from "./read-question";

interface NumberBlankProps {
  quantity: number;
  onChange: (quantity: number) => void;
}

/** How many kits. Answers while one types; what is no number of kits waits and says so. */
export function NumberBlank({ quantity, onChange }: NumberBlankProps) {
  const [text, setText] = useState(String(quantity));
  const isRefused = text !== "" && readKitCount(text) === null;

  useEffect(() => setText(String(quantity)), [quantity]);

  function type(next: string) {
    setText(next);
    const count = readKitCount(next);
    if (count !== null && count !== quantity) onChange(count);
  }

  return (
    <span className="relative">
      <input
        type="number"
        name="quantity"
        aria-label="How many kits"
        aria-invalid={isRefused}
        aria-describedby={isRefused ? "quantity-refused" : undefined}
        min={1}
        max={MOST_KITS}
        step={1}
        inputMode="numeric"
        autoComplete="off"
        value={text}
        onChange={(event) => type(event.target.value)}
        onBlur={() => text === "" && setText(String(quantity))}
        onFocus={(event) => event.target.select()}
        className="blank figure w-[4.5ch] text-center font-semibold supports-[field-sizing:content]:w-auto supports-[field-sizing:content]:min-w-[1.6em]"
      />
      {isRefused && (
        <span
          id="quantity-refused"
          role="alert"
          className="absolute top-full left-0 z-10 mt-2 w-max max-sm:w-48 border border-stop bg-sheet px-3 py-1 text-base"
        >
          A whole number of kits from 1 to 1,000.
        </span>
      )}
    </span>
  );
}
