import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity } from '@shared/units/format';
import { decadesAround, type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from '@/components/chart/axis';
import { useWidth } from '@/components/chart/use-width';
import { partCurve, resonance_Hz, seriesMagnitude } from '../lib/part-curve';

const HEIGHT = 320;
const MARGIN = { left: 60, right: 12, top: 8, bottom: 26 };

type Curve = readonly (readonly [number, number])[];

const decades = (low: number, high: number): number[] =>
  Array.from({ length: Math.round(Math.log10(high / low)) + 1 }, (_, i) => low * 10 ** i);

/** Whole decades around both resonances and the ESR, at least five of frequency, so that the slopes show. */
function ranges(part: Part): { band: [number, number]; impedance: [number, number] } {
  const mounted = part.esl_H + part.mount_H;
  const f0 = resonance_Hz(part, mounted) ?? 1 / (2 * Math.PI * part.capacitance_F);
  const band = decadesAround(f0 / 300, f0 * 100);
  const ends = band.map((f) => seriesMagnitude(part, mounted, f));
  const top = Math.max(...ends);
  const low = Math.max(part.esr_ohm / 1.5, top / 1e6);
  return { band, impedance: decadesAround(low, top) };
}

function Grid({ x, y }: { x: FrequencyAxis; y: ImpedanceAxis }) {
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

function Resonance({
  x,
  y,
  f0,
  z,
  label,
}: {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  f0: number;
  z: number;
  label: string;
}) {
  const px = xOf(x, f0);
  const py = yOf(y, z);
  return (
    <g>
      <path d={`M${px} ${py}V${y.height}`} className="stroke-deep" strokeDasharray="2 4" />
      <circle cx={px} cy={py} r="3" className="fill-paper stroke-deep" strokeWidth="1.5" />
      <text x={px} y={16} textAnchor="middle" className="fill-deep" fontSize="12">
        {label}
      </text>
      <path d={`M${px} 24V${py - 4}`} className="stroke-deep" strokeDasharray="2 4" strokeOpacity="0.5" />
    </g>
  );
}

/** |Z| over frequency of one capacitor, log–log: as mounted, and thinner the part alone. */
export function PartChart({ part }: { part: Part }) {
  const [ref, width] = useWidth<HTMLElement>();
  const { band, impedance } = ranges(part);
  const plotWidth = Math.max(120, width - MARGIN.left - MARGIN.right);
  const x: FrequencyAxis = { low_Hz: band[0], high_Hz: band[1], width: plotWidth };
  const y: ImpedanceAxis = {
    low_ohm: impedance[0],
    high_ohm: impedance[1],
    height: HEIGHT - MARGIN.top - MARGIN.bottom,
  };
  const path = (curve: Curve) =>
    `M${curve.map(([f, z]) => `${xOf(x, f).toFixed(1)} ${yOf(y, z).toFixed(1)}`).join('L')}`;
  const mounted_H = part.esl_H + part.mount_H;
  const f0 = resonance_Hz(part, mounted_H);
  const lowest = Math.max(part.esr_ohm, impedance[0]);
  const words = f0
    ? `lowest at ${formatQuantity(f0, 'Hz')} as mounted, there ${formatQuantity(part.esr_ohm, 'Ω')}`
    : 'no self-resonance: there is no inductance';
  return (
    <figure ref={ref} className="m-0 w-full">
      {width > 0 && (
        <svg
          width={width}
          height={HEIGHT}
          role="img"
          aria-label={`Impedance of ${part.partNumber} over frequency, ${words}`}
          fill="none"
          className="block"
        >
          <defs>
            <clipPath id="part-plot">
              <rect width={plotWidth} height={y.height} />
            </clipPath>
          </defs>
          <g transform={`translate(${MARGIN.left} ${MARGIN.top})`}>
            <Grid x={x} y={y} />
            <g clipPath="url(#part-plot)">
              <path
                d={path(partCurve(part, part.esl_H, band, impedance[0]))}
                className="stroke-stone"
                strokeWidth="1"
              />
              <path
                d={path(partCurve(part, mounted_H, band, impedance[0]))}
                className="stroke-ink"
                strokeWidth="2"
              />
            </g>
            {f0 !== null && <Resonance x={x} y={y} f0={f0} z={lowest} label={formatQuantity(f0, 'Hz')} />}
          </g>
        </svg>
      )}
      <figcaption className="mt-1 flex flex-wrap gap-x-6 text-small text-stone">
        <span>
          <svg width="20" height="8" className="mr-2 inline-block" aria-hidden="true">
            <path d="M0 4H20" className="stroke-ink" strokeWidth="2" />
          </svg>
          as mounted, {formatQuantity(mounted_H, 'H')}
        </span>
        <span>
          <svg width="20" height="8" className="mr-2 inline-block" aria-hidden="true">
            <path d="M0 4H20" className="stroke-stone" strokeWidth="1" />
          </svg>
          the part alone, {formatQuantity(part.esl_H, 'H')}
        </span>
        <span>catalogue values</span>
      </figcaption>
    </figure>
  );
}
