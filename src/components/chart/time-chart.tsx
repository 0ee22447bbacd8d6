import { formatQuantity } from '@shared/units/format';
import { useId } from 'react';
import { linearTicks, thinnedPath } from './linear-axis';
import { useWidth } from './use-width';

export interface TimeMark {
  time_s: number;
  value_V: number;
  label: string;
}

interface TimeChartProps {
  time_s: Float64Array;
  /** Departure from the voltage that the axis calls zero. */
  deviation_V: Float64Array;
  span_s: readonly [number, number];
  /** What the axis calls zero, e.g. the start of an edge late in the run. */
  origin_s?: number;
  /** Ripple that the bank may use, both ways; hatched beyond. null: not given. */
  allowance_V: number | null;
  /** A further level to name, e.g. the bound of a worst pattern. */
  levels?: readonly { value_V: number; label: string }[];
  marks?: readonly TimeMark[];
  /** Corners of the load current, drawn as a strip on the same axis. */
  load: readonly (readonly [number, number])[];
  label: string;
}

const LEFT = 64;
const RIGHT = 12;
const TOP = 10;
const HEIGHT = 210;
const STRIP = 34;
const GAP = 26;

/** The rail's voltage over time, and under it, on the same axis, the load current that makes it. */
export function TimeChart(props: TimeChartProps) {
  const [measure, width] = useWidth<HTMLElement>();
  return (
    <figure ref={measure} className="m-0 w-full">
      {width > LEFT + RIGHT + 80 && <Drawing {...props} width={width - LEFT - RIGHT} />}
    </figure>
  );
}

function Drawing({
  time_s,
  deviation_V,
  span_s,
  origin_s = 0,
  allowance_V,
  levels = [],
  marks = [],
  load,
  label,
  width,
}: TimeChartProps & { width: number }) {
  const hatch = useId();
  const clip = useId();
  const [from, to] = span_s;
  const extremes = extremesIn(time_s, deviation_V, span_s);
  const wanted = [...extremes, ...levels.map((one) => one.value_V), allowance_V ?? 0, -(allowance_V ?? 0)];
  const room = 0.12 * (Math.max(...wanted) - Math.min(...wanted) || 1e-3);
  const [low, high] = [Math.min(0, ...wanted) - room, Math.max(0, ...wanted) + room];
  const x = (t: number) => ((t - from) / (to - from)) * width;
  const y = (v: number) => HEIGHT * (1 - (v - low) / (high - low));
  const most = Math.max(...load.map(([, amps]) => amps), 1e-12);
  const least = Math.min(...load.map(([, amps]) => amps), 0);
  const loadY = (amps: number) => STRIP * (1 - (amps - least) / (most - least || 1));
  /** A mark's name stands outside the curve, but not on the line of the ripple allowed. */
  const markOffset = (value_V: number): number => {
    const outside = value_V < 0 ? 14 : -6;
    const limit = allowance_V === null ? null : y(value_V < 0 ? -allowance_V : allowance_V);
    const isOnLine = limit !== null && Math.abs(y(value_V) + outside - 4 - limit) < 12;
    return isOnLine ? (value_V < 0 ? -10 : 18) : outside;
  };
  const ticks = linearTicks(from - origin_s, to - origin_s, Math.max(3, Math.floor(width / 110)));
  return (
    <svg
      role="img"
      aria-label={label}
      width={width + LEFT + RIGHT}
      height={TOP + HEIGHT + GAP + STRIP + 8}
      className="block"
      fill="none"
      fontSize="12"
    >
      <defs>
        <pattern id={hatch} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <line x1="0" y1="0" x2="0" y2="6" className="stroke-shallow" strokeWidth="1.6" />
        </pattern>
        <clipPath id={clip}>
          <rect width={width} height={HEIGHT} />
        </clipPath>
      </defs>
      <g transform={`translate(${LEFT} ${TOP})`}>
        <g className="stroke-hairline">
          {linearTicks(low, high, 5).map((v) => (
            <g key={v}>
              <path d={`M0 ${y(v)}H${width}`} />
              <text x={-8} y={y(v) + 4} textAnchor="end" stroke="none" className="fill-stone">
                {v === 0 ? '0' : formatQuantity(v, 'V', { trim: true })}
              </text>
            </g>
          ))}
          {ticks.map((t, i) => (
            <g key={t}>
              <path d={`M${x(t + origin_s)} 0V${HEIGHT}`} />
              <text
                x={x(t + origin_s)}
                y={HEIGHT + 17}
                textAnchor={
                  i === 0 && x(t + origin_s) < 20 ? 'start' : x(t + origin_s) > width - 24 ? 'end' : 'middle'
                }
                stroke="none"
                className="fill-stone"
              >
                {t === 0 ? '0' : formatQuantity(t, 's', { trim: true })}
              </text>
            </g>
          ))}
        </g>
        <g clipPath={`url(#${clip})`}>
          {allowance_V !== null && (
            <>
              <rect
                width={width}
                height={Math.max(0, y(allowance_V))}
                fill={`url(#${hatch})`}
                opacity="0.6"
              />
              <rect
                y={y(-allowance_V)}
                width={width}
                height={Math.max(0, HEIGHT - y(-allowance_V))}
                fill={`url(#${hatch})`}
                opacity="0.6"
              />
              {[allowance_V, -allowance_V].map((v) => (
                <path key={v} d={`M0 ${y(v)}H${width}`} className="stroke-deep" strokeWidth="1.8" />
              ))}
            </>
          )}
          {levels.map((one) => (
            <path
              key={one.label}
              d={`M0 ${y(one.value_V)}H${width}`}
              className="stroke-kingfisher"
              strokeDasharray="5 4"
            />
          ))}
          <path d={thinnedPath(time_s, deviation_V, span_s, x, y)} className="stroke-ink" strokeWidth="1.8" />
        </g>
        {allowance_V !== null && (
          <Name x={width - 6} y={y(allowance_V) - 6} end>
            ripple allowed ±{formatQuantity(allowance_V, 'V')}
          </Name>
        )}
        {levels.map((one) => (
          <Name key={one.label} x={6} y={y(one.value_V) + (one.value_V > 0 ? -6 : 15)}>
            {one.label}
          </Name>
        ))}
        {marks
          .filter((mark) => mark.time_s >= from && mark.time_s <= to)
          .map((mark) => (
            <g key={mark.label}>
              <path
                d={`M${x(mark.time_s)} ${y(mark.value_V)}V${HEIGHT + GAP + STRIP}`}
                className="stroke-kingfisher"
                strokeDasharray="1.5 3"
              />
              <circle
                cx={x(mark.time_s)}
                cy={y(mark.value_V)}
                r="3.5"
                className="fill-paper stroke-kingfisher"
                strokeWidth="1.4"
              />
              <Name
                x={x(mark.time_s) + (x(mark.time_s) > width * 0.7 ? -8 : 8)}
                y={y(mark.value_V) + markOffset(mark.value_V)}
                end={x(mark.time_s) > width * 0.7}
              >
                {mark.label}
              </Name>
            </g>
          ))}
        <g transform={`translate(0 ${HEIGHT + GAP})`}>
          <path d={loadPath(load, span_s, x, loadY)} className="fill-shallow" stroke="none" />
          <path d={`M0 ${STRIP}H${width}`} className="stroke-hairline" />
          <text x={-8} y={11} textAnchor="end" className="fill-stone">
            {formatQuantity(most, 'A', { trim: true })}
          </text>
          <text x={-8} y={STRIP} textAnchor="end" className="fill-stone">
            load
          </text>
        </g>
      </g>
    </svg>
  );
}

function Name({
  x,
  y,
  end = false,
  children,
}: {
  x: number;
  y: number;
  end?: boolean;
  children: React.ReactNode;
}) {
  return (
    <text
      x={x}
      y={y}
      textAnchor={end ? 'end' : 'start'}
      className="fill-ink"
      stroke="var(--paper)"
      strokeWidth="4"
      paintOrder="stroke"
    >
      {children}
    </text>
  );
}

function extremesIn(
  time_s: Float64Array,
  value: Float64Array,
  [from, to]: readonly [number, number],
): [number, number] {
  let low = 0;
  let high = 0;
  for (let i = 0; i < time_s.length; i++) {
    if (time_s[i] < from || time_s[i] > to) continue;
    if (value[i] < low) low = value[i];
    if (value[i] > high) high = value[i];
  }
  return [low, high];
}

/** The load as an area, level before its first corner and after its last. */
function loadPath(
  load: readonly (readonly [number, number])[],
  [from, to]: readonly [number, number],
  x: (t: number) => number,
  y: (amps: number) => number,
): string {
  if (load.length === 0) return '';
  const clamp = (t: number) => x(Math.min(to, Math.max(from, t)));
  const points = [[from, currentAt(load, from)] as const];
  for (const corner of load) if (corner[0] > from && corner[0] < to) points.push(corner);
  points.push([to, currentAt(load, to)]);
  const line = points.map(([t, amps]) => `L${clamp(t).toFixed(1)} ${y(amps).toFixed(1)}`).join('');
  return `M${clamp(from)} ${STRIP}${line}L${clamp(to)} ${STRIP}Z`;
}

function currentAt(load: readonly (readonly [number, number])[], t: number): number {
  if (t <= load[0][0]) return load[0][1];
  for (let i = 1; i < load.length; i++) {
    const [t0, a0] = load[i - 1];
    const [t1, a1] = load[i];
    if (t <= t1) return t1 > t0 ? a0 + ((a1 - a0) * (t - t0)) / (t1 - t0) : a1;
  }
  return load[load.length - 1][1];
}
