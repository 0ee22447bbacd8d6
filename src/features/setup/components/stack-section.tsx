import { formatLength } from '@shared/units/format';
import type { DrawnHeights } from '../lib/drawn-heights';
import { type LiveLayer, totalThickness_m } from '../lib/live-layers';
import type { PairFigures } from '../lib/pair-figures';
import { spread } from '../lib/spread';
import { PairMarks } from './pair-marks';

interface Props {
  layers: readonly LiveLayer[];
  pairs: readonly PairFigures[];
  current: string | null;
  height: number;
  width: number;
  drawn: DrawnHeights;
  /** Where each layer's row stands beside the drawing; null: the drawing carries the names itself. */
  anchors: ReadonlyMap<string, number> | null;
}

/** Thin copper would vanish: it is drawn at least so high. */
export const LEAST_PX = 3;
const LEADER = 34;
const NAMES = 150;
const PAIRS = 66;

const FILL = { signal: 'fill-shallow', plane: 'fill-deep', dielectric: 'fill-wash' } as const;
const kindOf = (layer: LiveLayer) => (layer.kind === 'copper' ? layer.use : 'dielectric');

/** The board cut through, to scale; each layer is led to its row in the table, or to its name. */
export function StackSection({ layers, pairs, current, height, width, drawn, anchors }: Props) {
  const { heights } = drawn;
  const tops = heights.map((_, i) => heights.slice(0, i).reduce((sum, one) => sum + one, 0));
  const centres = tops.map((top, i) => top + heights[i] / 2);
  const names = anchors ? null : spread(centres, 16, 8, height - 8);
  const left = (names ? NAMES : 0) + LEADER;
  const right = Math.max(left + 40, width - PAIRS);
  return (
    <svg
      role="img"
      aria-label={`cross-section of ${layers.length} layers, ${formatLength(totalThickness_m(layers))} in all`}
      width={width}
      height={height}
      className="block overflow-visible text-small"
    >
      {layers.map((layer, i) => {
        const end = names ? names[i] : anchors?.get(layer.name);
        const isCurrent = layer.name === current;
        return (
          <g key={layer.name}>
            <rect
              x={left}
              y={tops[i]}
              width={right - left}
              height={heights[i]}
              className={FILL[kindOf(layer)]}
            />
            {end !== undefined && (
              <path
                d={`M${left - LEADER + 4} ${end}H${left - LEADER + 8}L${left - 6} ${centres[i]}H${left}`}
                fill="none"
                className={isCurrent ? 'stroke-deep' : 'stroke-stone'}
                strokeOpacity={isCurrent ? 1 : 0.45}
                strokeWidth={isCurrent ? 1.6 : 1}
              />
            )}
            {names && (
              <text
                x={NAMES}
                y={names[i] + 4}
                textAnchor="end"
                className={layer.kind === 'copper' ? 'fill-ink font-semibold' : 'fill-stone'}
              >
                {layer.label.length > 19 ? `${layer.label.slice(0, 18)}…` : layer.label}
              </text>
            )}
            {isCurrent && (
              <rect
                x={left - 1.5}
                y={tops[i] - 1.5}
                width={right - left + 3}
                height={heights[i] + 3}
                fill="none"
                className="stroke-deep"
                strokeWidth="1.5"
              />
            )}
          </g>
        );
      })}
      <PairMarks {...{ layers, pairs, tops, heights, x: right + 6, height }} />
    </svg>
  );
}
