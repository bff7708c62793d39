interface RungProps {
  ready: boolean;
  /** Stands for several kits: drawn with rungs close together. */
  isRun: boolean;
}

const Y = 19;

/** A piece of the ladder as high as its row: rails with a whole rung, or dotted rails with a broken one. */
export function Rung({ ready, isRun }: RungProps) {
  return (
    <svg
      aria-hidden="true"
      focusable="false"
      className={`absolute inset-0 size-full ${ready ? "text-ink" : "text-stop"}`}
      fill="none"
      stroke="currentColor"
      strokeLinecap="round"
    >
      <Rail x="12%" ready={ready} />
      <Rail x="88%" ready={ready} />
      {ready ? <WholeRung isRun={isRun} /> : <BrokenRung isRun={isRun} />}
    </svg>
  );
}

function Rail({ x, ready }: { x: string; ready: boolean }) {
  return ready ? (
    <line x1={x} x2={x} y1="0" y2="100%" strokeWidth="6" strokeLinecap="butt" />
  ) : (
    <line x1={x} x2={x} y1="4" y2="100%" strokeWidth="5" strokeDasharray="0.1 9" className="stroke-edge" />
  );
}

function WholeRung({ isRun }: { isRun: boolean }) {
  const heights = isRun ? [Y - 7, Y, Y + 7] : [Y];
  return heights.map((y) => <line key={y} x1="8%" x2="92%" y1={y} y2={y} strokeWidth={isRun ? 3 : 7} />);
}

function BrokenRung({ isRun }: { isRun: boolean }) {
  const heights = isRun ? [Y - 5, Y + 5] : [Y];
  return (
    <>
      {heights.map((y) => (
        <g key={y} strokeWidth={isRun ? 3 : 7}>
          <line x1="8%" x2="30%" y1={y} y2={y} />
          <line x1="70%" x2="92%" y1={y} y2={y} />
        </g>
      ))}
      <svg x="30%" y={Y - 6} width="12" height="12" overflow="visible" aria-hidden="true">
        <path d="M6 2l4 4-4 4" strokeWidth="2" />
      </svg>
      <svg x="70%" y={Y - 6} width="12" height="12" overflow="visible" aria-hidden="true">
        <path d="M-6 2l-4 4 4 4" strokeWidth="2" />
      </svg>
    </>
  );
}
