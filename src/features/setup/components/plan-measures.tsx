import type { PlanGeometry, Point } from '../lib/plan-geometry';

/** The drill in the left-hand via, the width in its trace, where they have room. */
export function Letters({
  plan,
  x,
  y,
  scale,
}: {
  plan: PlanGeometry;
  x: (mm: number) => number;
  y: (mm: number) => number;
  scale: number;
}) {
  const [[vx, vy]] = plan.vias;
  const [start, end] = plan.trace ?? [];
  const free = start && end ? (end[1] - start[1] - plan.ring / 2) * scale : 0;
  return (
    <g className="fill-ink" textAnchor="middle">
      {plan.drill * scale > 13 && (
        <text x={x(-vx)} y={y(vy) + 4}>
          d
        </text>
      )}
      {start && end && plan.reaches && free > 16 && plan.width * scale > 12 && (
        <text x={x(-(start[0] + end[0]) / 2)} y={y((start[1] + end[1] - plan.ring / 2) / 2) + 4}>
          w
        </text>
      )}
    </g>
  );
}

/** A measure between two places on one height, with lines down from where it starts. */
export function Across({
  from,
  to,
  y,
  start,
  text,
}: {
  from: number;
  to: number;
  y: number;
  start: number;
  text: string;
}) {
  return (
    <g className="stroke-stone">
      <path d={`M${from} ${start}V${y + 4}M${to} ${start}V${y + 4}`} strokeOpacity="0.6" />
      <path d={`M${from} ${y}H${to}m-4 -3l4 3l-4 3M${from + 4} ${y - 3}l-4 3l4 3`} />
      <text x={(from + to) / 2} y={y + 16} textAnchor="middle" className="fill-ink" stroke="none">
        {text}
      </text>
    </g>
  );
}

/** The trace's length, measured beside the drawing where it runs down, above it where it runs out sideways. */
export function Along({
  trace,
  x,
  y,
  edge,
}: {
  trace: readonly Point[];
  x: (mm: number) => number;
  y: (mm: number) => number;
  edge: number;
}) {
  const [[x0, y0], [x1, y1]] = trace;
  if (y1 - y0 < 0.05) return null;
  const [from, to] = [y(y0), y(y1)];
  return (
    <g className="stroke-stone">
      <path d={`M${x(x0) + 2} ${from}H${edge + 4}M${x(x1) + 2} ${to}H${edge + 4}`} strokeOpacity="0.6" />
      <path d={`M${edge} ${from}V${to}`} />
      {to - from > 12 && <path d={`M${edge - 3} ${from + 4}l3 -4l3 4M${edge - 3} ${to - 4}l3 4l3 -4`} />}
      <text x={edge + 8} y={(from + to) / 2 + 4} className="fill-ink" stroke="none">
        l
      </text>
    </g>
  );
}
