import type { SectionFrame } from '../lib/section-frame';
import type { SectionGeometry } from '../lib/section-geometry';

interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** A plated hole: dark walls where current runs, pale ones where it only goes on through the board. */
export function Barrel({ beyond, used }: { beyond: Box; used: Box }) {
  const walls = ({ x, y, width, height }: Box) => `M${x} ${y}v${height}M${x + width} ${y}v${height}`;
  return (
    <>
      <rect {...beyond} className="fill-paper" />
      <path d={walls(beyond)} className="stroke-stone" strokeDasharray="2 3" />
      <path d={walls(used)} className="stroke-ink" strokeWidth="2.4" />
    </>
  );
}

const STUB = 15;

/** The part closes the loop; its ends are drawn cut off, since how tall it is does not matter here. */
export function PartEnds({ geometry, frame }: { geometry: SectionGeometry; frame: SectionFrame }) {
  const base = frame.z(0);
  const end = base + (frame.isTop ? -STUB : STUB);
  return geometry.part.map(([from, to], i) => (
    <g key={from}>
      <path
        d={`M${frame.x(from)} ${end}V${base}H${frame.x(to)}V${end}`}
        className="fill-paper stroke-stone"
        strokeDasharray="2 3"
      />
      {i === 0 && (
        <PartName {...{ from: frame.x(from), to: frame.x(to), y: frame.isTop ? base - 4 : base + 13 }} />
      )}
    </g>
  ));
}

/** In the part's end, or beside it over the trace where that is too narrow. */
function PartName({ from, to, y }: { from: number; to: number; y: number }) {
  const isWide = to - from > 34;
  return (
    <text
      x={isWide ? (from + to) / 2 : to + 6}
      y={y}
      textAnchor={isWide ? 'middle' : 'start'}
      className="fill-stone"
    >
      part
    </text>
  );
}
