import { formatQuantity } from '@shared/units/format';
import { type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from '@/components/chart/axis';

interface Props {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  at: readonly [frequency_Hz: number, impedance_ohm: number];
}

/** Where a curve is lowest: its frequency above, a plumb line through it. */
export function ResonanceMark({ x, y, at: [f0, z] }: Props) {
  const px = xOf(x, f0);
  const py = yOf(y, z);
  return (
    <g>
      <path d={`M${px} ${py}V${y.height}`} className="stroke-deep" strokeDasharray="2 4" />
      <circle cx={px} cy={py} r="3" className="fill-paper stroke-deep" strokeWidth="1.5" />
      <text x={px} y={16} textAnchor="middle" className="fill-deep" fontSize="12">
        {formatQuantity(f0, 'Hz')}
      </text>
      <path d={`M${px} 24V${py - 4}`} className="stroke-deep" strokeDasharray="2 4" strokeOpacity="0.5" />
    </g>
  );
}
