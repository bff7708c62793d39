import { formatNumber } from "~/utils/format/format-number";

interface KitsCoveredProps {
  /** First kit that the part stops. */
  stopsAt: number;
  asked: number;
}

const MOST_BOXES = 12;
const BAR = 108;

/** How far a part's stock reaches: full boxes for kits it covers, hollow ones from the first it stops. */
export function KitsCovered({ stopsAt, asked }: KitsCoveredProps) {
  const covered = Math.min(stopsAt - 1, asked);
  return (
    <>
      {asked <= MOST_BOXES ? (
        <Boxes covered={covered} asked={asked} />
      ) : (
        <Bar covered={covered} asked={asked} />
      )}
      <span className="text-[0.9375rem] text-soft">stops kit {formatNumber(stopsAt)}</span>
    </>
  );
}

function Boxes({ covered, asked }: { covered: number; asked: number }) {
  const kits = Array.from({ length: asked }, (_, place) => place);
  return (
    <svg width={asked * 9} height="14" aria-hidden="true" focusable="false" className="mb-0.5 block">
      {kits.map((kit) =>
        kit < covered ? (
          <rect key={kit} x={kit * 9} y="1" width="7" height="12" className="fill-ink" />
        ) : (
          <rect
            key={kit}
            x={kit * 9 + 0.5}
            y="1.5"
            width="6"
            height="11"
            fill="none"
            className="stroke-stop"
          />
        ),
      )}
    </svg>
  );
}

function Bar({ covered, asked }: { covered: number; asked: number }) {
  const full = Math.round((covered / asked) * BAR);
  return (
    <svg width={BAR} height="14" aria-hidden="true" focusable="false" className="mb-0.5 block">
      <rect x="0.5" y="1.5" width={BAR - 1} height="11" fill="none" className="stroke-stop" />
      <rect x="0" y="1" width={full} height="12" className="fill-ink" />
    </svg>
  );
}
