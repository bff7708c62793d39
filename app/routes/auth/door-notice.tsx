import { useEffect, useRef } from "react";

/** What went wrong with the whole form; takes the focus, so that it is read first. */
export function DoorNotice({ children }: { children: string }) {
  const notice = useRef<HTMLParagraphElement>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: a new text takes the focus again.
  useEffect(() => notice.current?.focus(), [children]);
  return (
    <p
      ref={notice}
      role="alert"
      tabIndex={-1}
      className="mt-5 border-ink border-l-4 bg-sheet px-4 py-3 font-bold"
    >
      {children}
    </p>
  );
}
