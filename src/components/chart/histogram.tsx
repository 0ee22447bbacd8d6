import { useId } from 'react';
import { linearTicks } from './linear-axis';
import { useWidth } from './use-width';

interface HistogramProps {
  /** Rising. */
  values: Float64Array;
  /** Below it a bar is hatched: short. */
  threshold: number;
  unit: string;
  label: string;
}

const HEIGHT = 120;
const FOOT = 22;
const BARS = 48;

/** How often each value came up; what lies below the threshold is hatched, so that colour does not speak alone. */
export function Histogram({ values, threshold, unit, label }: HistogramProps) {
  const [measure, width] = useWidth<HTMLElement>();
  const hatch = useId();
  const lowest = Math.min(values[0], threshold);
  const highest = Math.max(values[values.length - 1], threshold);
  const bins = binsAround(lowest, highest, threshold);
  const { low, high } = bins;
  const counts = countInto(values, bins);
  const most = Math.max(...counts, 1);
  const x = (value: number) => ((value - low) / (high - low)) * width;
  return (
    <figure ref={measure} className="m-0 w-full">
      {width > 80 && (
        <svg role="img" aria-label={label} width={width} height={HEIGHT + FOOT} fontSize="12">
          <defs>
            <pattern
              id={hatch}
              width="5"
              height="5"
              patternUnits="userSpaceOnUse"
              patternTransform="rotate(45)"
            >
              <rect width="5" height="5" className="fill-paper" />
              <line x1="0" y1="0" x2="0" y2="5" className="stroke-kingfisher" strokeWidth="3" />
            </pattern>
          </defs>
          {counts.map((count, i) => {
            const from = low + bins.step * i;
            const height = (HEIGHT * count) / most;
            return (
              <rect
                key={from}
                x={x(from) + 0.5}
                y={HEIGHT - height}
                width={Math.max(1, width / counts.length - 1)}
                height={height}
                className={from >= threshold - bins.step / 2 ? 'fill-deep' : undefined}
                fill={from >= threshold - bins.step / 2 ? undefined : `url(#${hatch})`}
              />
            );
          })}
          <path d={`M0 ${HEIGHT}H${width}`} className="stroke-hairline" />
          <path d={`M${x(threshold)} 0V${HEIGHT + 4}`} className="stroke-ink" strokeWidth="1.4" />
          {linearTicks(low, high, Math.max(2, Math.floor(width / 90))).map((tick) => (
            <text
              key={tick}
              x={Math.min(width - 24, Math.max(24, x(tick)))}
              y={HEIGHT + 16}
              textAnchor="middle"
              className="fill-stone"
            >
              {String(tick).replace('-', '−')} {unit}
            </text>
          ))}
        </svg>
      )}
    </figure>
  );
}

interface Bins {
  low: number;
  high: number;
  step: number;
}

/** Even bins over the range with a little room, one of their edges on the threshold, so that no bar is both. */
function binsAround(lowest: number, highest: number, threshold: number): Bins {
  const step = (1.08 * (highest - lowest || 1)) / BARS;
  const low = threshold - Math.ceil((threshold - lowest) / step + 0.5) * step;
  const high = threshold + Math.ceil((highest - threshold) / step + 0.5) * step;
  return { low, high, step };
}

function countInto(values: Float64Array, { low, high, step }: Bins): number[] {
  const counts = new Array<number>(Math.round((high - low) / step)).fill(0);
  for (const value of values)
    counts[Math.min(counts.length - 1, Math.max(0, Math.floor((value - low) / step + 1e-9)))]++;
  return counts;
}
