import { formatQuantity } from '@shared/units/format';
import { placeOn } from '../lib/axis-places';
import { type CapacitanceAxes, heightOf } from '../lib/capacitance-axes';

/** The point in service. */
export interface Mark {
  x: number;
  capacitance_F: number;
  estimated: boolean;
}

interface Props {
  axes: CapacitanceAxes;
  mark: Mark;
  /** The upper end of the band where the mark is: its value stands clear of it. */
  above_F: number;
}

/** Room that the value takes, px. */
const TEXT_WIDTH = 92;

/** The point in service with its value, and the plumb line towards the float that moves it. */
export function CapacitanceMark({ axes, mark, above_F }: Props) {
  const { x, y } = axes;
  const px = placeOn(x, mark.x);
  const py = heightOf(axes, mark.capacitance_F);
  const isAtEnd = px > x.length - TEXT_WIDTH;
  const stroke = mark.estimated ? 'stroke-brass' : 'stroke-deep';
  return (
    <g>
      <path d={`M${px} ${py}V${y.length + 4}`} className={stroke} strokeDasharray="2 4" />
      <circle cx={px} cy={py} r="4" className={`fill-paper ${stroke}`} strokeWidth="1.8" />
      <text
        x={px + (isAtEnd ? 4 : 8)}
        y={heightOf(axes, above_F) - 9}
        textAnchor={isAtEnd ? 'end' : 'start'}
        className={`font-semibold ${mark.estimated ? 'fill-brass' : 'fill-deep'}`}
        fontSize="13"
        stroke="var(--paper)"
        strokeWidth="4"
        paintOrder="stroke"
      >
        {mark.estimated ? '≈ ' : ''}
        {formatQuantity(mark.capacitance_F, 'F')}
      </text>
    </g>
  );
}
