import { formatQuantity } from '@shared/units/format';
import { useWidth } from '@/components/chart/use-width';
import type { CurveName } from '../lib/curve-fields';
import { celsiusText } from '../lib/situation';
import { sketchOf } from '../lib/sketch';
import { volts } from '../lib/volts';

const HEIGHT = 108;
/** Beyond so many points their dots would only make the line thick. */
const MOST_DOTS = 40;

const ohm = (value: number) => formatQuantity(value, 'Ω', { trim: true });
const hertz = (value: number) => formatQuantity(value, 'Hz', { trim: true });
const factor = (value: number) => String(Number(value.toPrecision(3)));

const SCALES: Readonly<
  Record<CurveName, { x: (value: number) => string; y: (value: number) => string; what: string }>
> = {
  bias_curve: { x: volts, y: factor, what: 'C ÷ C(0 V)' },
  temperature_curve: { x: celsiusText, y: factor, what: 'C ÷ C(25 °C)' },
  esr_table: { x: hertz, y: ohm, what: 'ESR' },
  impedance_table: { x: hertz, y: ohm, what: '|Z|' },
};

/** What has been typed, drawn while one types; its edges are labelled with where it begins and ends. */
export function CurveSketch({ name, rows }: { name: CurveName; rows: readonly (readonly number[])[] }) {
  const [ref, width] = useWidth<HTMLElement>();
  const sketch = sketchOf(name, rows);
  const { x, y, what } = SCALES[name];
  const place = ([px, py]: readonly [number, number]) =>
    [4 + px * (width - 8), 4 + (1 - py) * (HEIGHT - 8)] as const;
  const placed = sketch?.points.map(place) ?? [];
  return (
    <figure ref={ref} className="m-0 flex min-w-0 flex-col gap-1">
      <div className="flex justify-between gap-2 text-small text-stone">
        <span>{what}</span>
        {sketch && (
          <span>
            {y(sketch.edges.bottom)} … {y(sketch.edges.top)}
          </span>
        )}
      </div>
      <div className="border" style={{ height: HEIGHT + 2 }}>
        {width > 0 && sketch && (
          <svg width={width - 2} height={HEIGHT} className="block" fill="none" aria-hidden="true">
            <path
              d={`M${placed.map((p) => p.join(' ')).join('L')}`}
              className="stroke-ink"
              strokeWidth="1.5"
            />
            {placed.length <= MOST_DOTS &&
              placed.map(([px, py]) => (
                <circle
                  key={px}
                  cx={px}
                  cy={py}
                  r="2.5"
                  className="fill-paper stroke-deep"
                  strokeWidth="1.2"
                />
              ))}
          </svg>
        )}
      </div>
      {sketch && (
        <div className="flex justify-between gap-2 text-small text-stone">
          <span>{x(sketch.edges.left)}</span>
          <span>{x(sketch.edges.right)}</span>
        </div>
      )}
    </figure>
  );
}
