import { useEffect, useRef } from "react";
import { addKey, isWithin, NO_BURST, scannedText } from "~/domain/scanning/key-burst";
import { isField } from "./is-field";

/** A wedge scanner types the separators of a label as these keys with Ctrl. */
const SEPARATORS: Record<string, string> = { "]": "\u001d", "^": "\u001e" };

/**
 * Hears a wedge scanner on a page where no field has the focus: keys faster than anybody types, then Enter. What a
 * person types, and every shortcut, goes its way; only that Enter is taken, so that it presses no button. A page
 * with a scanner of its own takes the Enter first (`preventDefault`).
 */
export function useWedgeScanner(onScan: (text: string) => void) {
  const latest = useRef(onScan);
  useEffect(() => {
    latest.current = onScan;
  }, [onScan]);

  useEffect(() => {
    let burst = NO_BURST;
    function onKey(event: KeyboardEvent) {
      if (event.defaultPrevented && event.key === "Enter") return;
      if (isField(event.target) || event.metaKey || event.isComposing) return;
      const at = event.timeStamp;
      if (event.key === "Enter") {
        const text = scannedText(burst, at);
        burst = NO_BURST;
        if (text === null) return;
        event.preventDefault();
        latest.current(text);
        return;
      }
      const character = characterOf(event);
      if (character === null) return;
      // A space in the middle of a code must not press the button that has the focus.
      if (character === " " && isWithin(burst, at)) event.preventDefault();
      burst = addKey(burst, character, at);
    }
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, []);
}

function characterOf(event: KeyboardEvent): string | null {
  if (event.ctrlKey && !event.altKey) return SEPARATORS[event.key] ?? null;
  return event.key.length === 1 ? event.key : null;
}
