import { type RefObject, useEffect } from "react";
import { isField } from "./is-field";

/** A scanned code may hold a `/`: only one that stands alone is meant for the box. */
const ALONE_FOR = 60;

/** The key `/` puts the focus into the box, unless it is typed into a field. */
export function useSlashKey(box: RefObject<HTMLInputElement | null>) {
  useEffect(() => {
    let last = Number.NEGATIVE_INFINITY;
    let timer: ReturnType<typeof setTimeout> | undefined;
    function onKey(event: KeyboardEvent) {
      clearTimeout(timer);
      const isAlone = event.timeStamp - last > ALONE_FOR;
      last = event.timeStamp;
      const isShortcut = event.key === "/" && !event.ctrlKey && !event.metaKey && !event.altKey;
      if (!isShortcut || !isAlone || event.defaultPrevented || isField(event.target)) return;
      event.preventDefault();
      timer = setTimeout(() => {
        box.current?.focus();
        box.current?.select();
      }, ALONE_FOR);
    }
    window.addEventListener("keydown", onKey);
    return () => {
      clearTimeout(timer);
      window.removeEventListener("keydown", onKey);
    };
  }, [box]);
}
