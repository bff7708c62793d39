interface CotterPinProps {
  /** A pin that is in: the kit is ready. A pin that is not: its eye above an empty hole. */
  seated: boolean;
  className?: string;
}

/** The mark of the ship line: one pin a kit. Its shape tells the state, colour only repeats it. */
export function CotterPin({ seated, className }: CotterPinProps) {
  return (
    <svg
      viewBox="0 0 14 24"
      aria-hidden="true"
      focusable="false"
      className={className}
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      strokeLinecap="round"
    >
      {seated ? (
        <path d="M5 22V9.6a5 5 0 1 1 4 0V22" />
      ) : (
        <>
          <path d="M5 14V9.6a5 5 0 1 1 4 0V14" />
          <path d="M2 21h10" />
        </>
      )}
    </svg>
  );
}
