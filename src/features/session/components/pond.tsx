import { formatQuantity } from '@shared/units/format';
import { POND_BAND_Hz, POND_END_Hz, POND_TARGET_OHM, pondLines, pondTotal } from './pond-curve';

const WIDTH = 760;
const HEIGHT = 560;
const LEFT = 8;
const RIGHT = WIDTH - 8;
const WATER_Y = 270;
const BED_Y = 508;
/** 1 mΩ lies on the bed. */
const BED_OHM = 1e-3;

const x = (f: number) =>
  LEFT + (Math.log(f / POND_BAND_Hz[0]) / Math.log(POND_BAND_Hz[1] / POND_BAND_Hz[0])) * (RIGHT - LEFT);
const y = (z: number) =>
  BED_Y - (Math.log(z / BED_OHM) / Math.log(POND_TARGET_OHM / BED_OHM)) * (BED_Y - WATER_Y);
const path = (points: readonly [number, number][]) =>
  `M${points.map(([f, z]) => `${x(f).toFixed(1)} ${y(z).toFixed(1)}`).join('L')}`;

const DECADES = [1e4, 1e5, 1e6, 1e7, 1e8];
const SUN_X = 250;
const total = path(pondTotal());
const lines = pondLines().map(({ id, points }) => ({ id, d: path(points) }));
const ticks = DECADES.slice(0, -1).flatMap((decade) => [2, 3, 4, 5, 6, 7, 8, 9].map((n) => n * decade));

function Label({ f }: { f: number }) {
  const anchor = f === DECADES[0] ? 'start' : f === DECADES[DECADES.length - 1] ? 'end' : 'middle';
  return (
    <text x={x(f)} y={HEIGHT - 22} textAnchor={anchor} className="fill-stone" fontSize="11">
      {formatQuantity(f, 'Hz', { trim: true })}
    </text>
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
          <rect x={LEFT} y={60} width={RIGHT - LEFT} height={BED_Y - 60} />
        </clipPath>
      </defs>
      {DECADES.map((f) => (
        <path key={f} d={`M${x(f)} 60V${BED_Y}`} className="stroke-hairline" />
      ))}
      <path
        d={`M${SUN_X - 78} ${WATER_Y}a78 78 0 0 1 156 0`}
        className="fill-paper stroke-ink"
        strokeWidth="1.5"
      />
      <rect x={LEFT} y={WATER_Y - 16} width={x(POND_END_Hz) - LEFT} height="16" fill="url(#pond-hatch)" />
      <g clipPath="url(#pond-water)">
        {lines.map(({ id, d }) => (
          <path key={id} d={d} className="stroke-stone" strokeWidth="0.75" strokeOpacity="0.45" />
        ))}
        {[14, 26, 39, 54].map((depth, i) => (
          <path
            key={depth}
            d={`M${SUN_X - 62 + i * 15} ${WATER_Y + depth}h${124 - i * 30}`}
            className="stroke-shallow"
            strokeWidth="1.5"
          />
        ))}
        <path d={total} className="stroke-ink" strokeWidth="1.9" />
      </g>
      <path d={`M${LEFT} ${WATER_Y}H${x(POND_END_Hz)}`} className="stroke-deep" strokeWidth="2.2" />
      <text x={x(POND_END_Hz) - 4} y={WATER_Y - 24} textAnchor="end" className="fill-deep" fontSize="11">
        waterline {formatQuantity(POND_TARGET_OHM, 'Ω')}
      </text>
      <path d={`M${LEFT} ${BED_Y}H${RIGHT}`} className="stroke-stone" strokeWidth="1" />
      <path d={ticks.map((f) => `M${x(f).toFixed(1)} ${BED_Y}v-5`).join('')} className="stroke-stone" />
      {DECADES.map((f) => (
        <Label key={f} f={f} />
      ))}
    </svg>
  );
}
