import { formatQuantity } from '@shared/units/format';
import { type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from '@/components/chart/axis';

const decades = (low: number, high: number): number[] =>
  Array.from({ length: Math.round(Math.log10(high / low)) + 1 }, (_, i) => low * 10 ** i);

/** Decades of both scales as hairlines, with their numbers. */
export function ImpedanceGrid({ x, y }: { x: FrequencyAxis; y: ImpedanceAxis }) {
  const rows = decades(y.low_ohm, y.high_ohm);
  const columns = decades(x.low_Hz, x.high_Hz);
  const every = x.width < 480 ? 2 : 1;
  return (
    <g className="stroke-hairline" fontSize="12">
      {rows.map((z) => (
        <g key={z}>
          <path d={`M0 ${yOf(y, z)}H${x.width}`} />
          <text x={-8} y={yOf(y, z) + 4} textAnchor="end" stroke="none" className="fill-stone">
            {formatQuantity(z, 'Ω', { trim: true })}
          </text>
        </g>
      ))}
      {columns.map((f, i) => (
        <g key={f}>
          <path d={`M${xOf(x, f)} 0V${y.height}`} />
          {i % every === 0 && (
            <text
              x={xOf(x, f)}
              y={y.height + 18}
              textAnchor={i === 0 ? 'start' : i === columns.length - 1 ? 'end' : 'middle'}
              stroke="none"
              className="fill-stone"
            >
              {formatQuantity(f, 'Hz', { trim: true })}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}
