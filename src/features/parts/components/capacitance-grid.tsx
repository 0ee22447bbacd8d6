import { formatQuantity } from '@shared/units/format';
import { placeOn, ticksWithEnds } from '../lib/axis-places';
import { type CapacitanceAxes, heightOf, MARGIN } from '../lib/capacitance-axes';

/** Room that a label under the axis takes with some air, px. */
const LABEL_APART = 58;

const farad = (value: number) => (value === 0 ? '0' : formatQuantity(value, 'F', { trim: true }));

interface Props {
  axes: CapacitanceAxes;
  writeX: (value: number) => string;
}

/** Both scales as hairlines with their numbers; the last one under the axis stands flush with the margin. */
export function CapacitanceGrid({ axes, writeX }: Props) {
  const { x, y, rows } = axes;
  return (
    <g className="stroke-hairline text-small">
      {rows.map((c) => (
        <g key={c}>
          <path d={`M0 ${heightOf(axes, c)}H${x.length}`} />
          <text x={-8} y={heightOf(axes, c) + 4} textAnchor="end" stroke="none" className="fill-stone">
            {farad(c)}
          </text>
        </g>
      ))}
      {ticksWithEnds(x, Math.max(2, Math.floor(x.length / 68)), LABEL_APART).map((value) => {
        const anchor = value === x.low ? 'start' : value === x.high ? 'end' : 'middle';
        return (
          <g key={value}>
            <path d={`M${placeOn(x, value)} 0V${y.length}`} />
            <text
              x={placeOn(x, value) + (anchor === 'end' ? MARGIN.right : 0)}
              y={y.length + 17}
              textAnchor={anchor}
              stroke="none"
              className="fill-stone"
            >
              {writeX(value)}
            </text>
          </g>
        );
      })}
    </g>
  );
}
