import { type RefObject, useEffect, useRef } from "react";
import { useLocation } from "react-router";

/** Closes an open `<details>` on Escape, on a press outside it, and when the page changes. */
export function useCloseDetails(ref: RefObject<HTMLDetailsElement | null>) {
  const { pathname } = useLocation();
  const seen = useRef(pathname);
  useEffect(() => {
    if (seen.current === pathname) return;
    seen.current = pathname;
    ref.current?.removeAttribute("open");
  }, [pathname, ref]);

  useEffect(() => {
    function onKey(event: KeyboardEvent) {
      const details = ref.current;
      if (event.key !== "Escape" || !details?.open) return;
      details.open = false;
      details.querySelector("summary")?.focus();
    }
    function onPress(event: PointerEvent) {
      const details = ref.current;
      if (details?.open && !details.contains(event.target as Node)) details.open = false;
    }
    document.addEventListener("keydown", onKey);
    document.addEventListener("pointerdown", onPress);
    return () => {
      document.removeEventListener("keydown", onKey);
      document.removeEventListener("pointerdown", onPress);
    };
  }, [ref]);
}
