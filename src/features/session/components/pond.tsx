import { formatQuantity } from '@shared/units/format';
import { POND_BAND_Hz, POND_END_Hz, POND_TARGET_OHM, pondLines, pondTotal } from './pond-curve';

const WIDTH = 760;
const HEIGHT = 520;
const LEFT = 8;
const RIGHT = WIDTH - 8;
const TOP = 40;
const WATER_Y = 220;
const BED_Y = 474;
/** The impedance that lies on the bed. */
const BED_OHM = 0.6e-3;
const SUN = { x: 282, r: 104 };

const DECADES = [1e4, 1e5, 1e6, 1e7, 1e8];
const TICKS = DECADES.slice(0, -1).flatMap((decade) => [2, 3, 4, 5, 6, 7, 8, 9].map((n) => n * decade));
const RIPPLES = [13, 24, 37, 53, 72];

const octaves = Math.log(POND_BAND_Hz[1] / POND_BAND_Hz[0]);
const x = (f: number) => LEFT + (Math.log(f / POND_BAND_Hz[0]) / octaves) * (RIGHT - LEFT);
const y = (z: number) =>
  BED_Y - (Math.log(z / BED_OHM) / Math.log(POND_TARGET_OHM / BED_OHM)) * (BED_Y - WATER_Y);
const path = (points: readonly [number, number][]) =>
  `M${points.map(([f, z]) => `${x(f).toFixed(1)} ${y(z).toFixed(1)}`).join('L')}`;

const total = path(pondTotal());
const lines = pondLines().map(({ id, points }) => ({ id, d: path(points) }));

function Axis() {
  return (
    <g>
      <path d={`M${LEFT} ${BED_Y}H${RIGHT}`} className="stroke-stone" />
      <path
        d={TICKS.map((f) => `M${x(f).toFixed(1)} ${BED_Y}v-5`).join('')}
        className="stroke-stone"
        strokeOpacity="0.7"
      />
      {DECADES.map((f, i) => (
        <text
          key={f}
          x={x(f)}
          y={BED_Y + 22}
          textAnchor={i === 0 ? 'start' : i === DECADES.length - 1 ? 'end' : 'middle'}
          className="fill-stone"
          fontSize="11"
        >
          {formatQuantity(f, 'Hz', { trim: true })}
        </text>
      ))}
    </g>
  );
}

function Sun() {
  return (
    <g>
      <path
        d={`M${SUN.x - SUN.r} ${WATER_Y}a${SUN.r} ${SUN.r} 0 0 1 ${2 * SUN.r} 0`}
        className="stroke-ink"
        strokeWidth="1.6"
      />
      {RIPPLES.map((depth, i) => (
        <path
          key={depth}
          d={`M${SUN.x - SUN.r + 16 + i * 19} ${WATER_Y + depth}h${2 * (SUN.r - 16 - i * 19)}`}
          className="stroke-shallow"
          strokeWidth="1.6"
        />
      ))}
    </g>
  );
}

/** The pond at dusk over its frequency axis: waterline, the rail's impedance below it, one thin line a capacitor. */
export function Pond({ className }: { className?: string }) {
  return (
    <svg viewBox={`0 0 ${WIDTH} ${HEIGHT}`} className={className} fill="none" aria-hidden="true">
      <defs>
        <pattern
          id="pond-hatch"
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V7" className="stroke-shallow" strokeWidth="1" />
        </pattern>
        <clipPath id="pond-water">
          <rect x={LEFT} y={WATER_Y} width={RIGHT - LEFT} height={BED_Y - WATER_Y} />
        </clipPath>
        <clipPath id="pond-paper">
          <rect x={LEFT} y={TOP} width={RIGHT - LEFT} height={BED_Y - TOP} />
        </clipPath>
      </defs>
      {DECADES.map((f) => (
        <path key={f} d={`M${x(f)} ${WATER_Y}V${BED_Y}`} className="stroke-hairline" />
      ))}
      <rect x={LEFT} y={WATER_Y - 12} width={x(POND_END_Hz) - LEFT} height="12" fill="url(#pond-hatch)" />
      <Sun />
      <g clipPath="url(#pond-water)">
        {lines.map(({ id, d }) => (
          <path key={id} d={d} className="stroke-stone" strokeWidth="0.8" strokeOpacity="0.45" />
        ))}
      </g>
      <path d={total} clipPath="url(#pond-paper)" className="stroke-ink" strokeWidth="2" />
      <path d={`M${LEFT} ${WATER_Y}H${x(POND_END_Hz)}`} className="stroke-deep" strokeWidth="2.2" />
      <text x={x(POND_END_Hz) - 4} y={WATER_Y - 20} textAnchor="end" className="fill-deep" fontSize="11">
        waterline {formatQuantity(POND_TARGET_OHM, 'Ω')}
      </text>
      <Axis />
    </svg>
  );
}
