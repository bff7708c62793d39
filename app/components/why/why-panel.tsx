import { type MouseEvent, useCallback, useEffect, useLayoutEffect, useRef } from "react";
import { Link, useNavigate, useSearchParams } from "react-router";
import { walkLinks } from "~/hooks/walk-links";
import type { WhyAnswer } from "~/schemas/planning/why";
import { WhyBody } from "./why-body";
import { WhyPath } from "./why-path";

interface WhyPanelProps {
  why: WhyAnswer | null;
  /** The parts walked from. */
  via: string[];
  problem: string | null;
}

const OF_WHY = ["part", "kits", "with", "through", "via"];

/** The causes of a number, beside Check at a desk and over it on a small page. Escape closes it. */
export function WhyPanel({ why, via, problem }: WhyPanelProps) {
  const { panel, close, back } = useOpenPanel();
  const title = useRef<HTMLHeadingElement>(null);
  const part = why?.part.partNumber;
  // biome-ignore lint/correctness/useExhaustiveDependencies: each step of the walk is read out anew
  useEffect(() => title.current?.focus(), [part, why?.with]);

  return (
    <dialog
      ref={panel}
      open
      aria-labelledby="why-title"
      onCancel={(event) => {
        event.preventDefault();
        close();
      }}
      onClick={(event: MouseEvent) => event.target === panel.current && close()}
      onKeyDown={walkLinks}
      className="why-panel"
    >
      <div className="px-4 pt-3 pb-8 sm:px-8 sm:pt-6">
        <div className="flex items-start justify-between gap-4 print:hidden">
          <WhyPath why={why} via={via} />
          <Link to={back} preventScrollReset className="-mr-2 shrink-0 p-2 underline">
            Close
          </Link>
        </div>
        {why === null ? (
          <>
            <h2 id="why-title" ref={title} tabIndex={-1} className="text-2xl outline-none">
              Nothing to open here
            </h2>
            <p role="alert" className="mt-3 max-w-prose">
              {problem}
            </p>
          </>
        ) : (
          <WhyBody why={why} via={via} title={title} />
        )}
      </div>
    </dialog>
  );
}

/** Opens as a modal, so that the focus stays in it and goes back to where it came from. */
function useOpenPanel() {
  const panel = useRef<HTMLDialogElement>(null);
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const left = new URLSearchParams(search);
  for (const name of OF_WHY) left.delete(name);
  const back = `/check${left.size > 0 ? `?${left}` : ""}`;
  const close = useCallback(() => void navigate(back, { preventScrollReset: true }), [navigate, back]);
  useLayoutEffect(() => {
    const dialog = panel.current;
    // Sent open, so that it is there before any script; as a modal it keeps the focus and gives it back.
    dialog?.close();
    dialog?.showModal();
    return () => dialog?.close();
  }, []);
  return { panel, close, back };
}
