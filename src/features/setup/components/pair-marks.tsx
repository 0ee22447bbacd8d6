import { thicknessText } from '../lib/length-text';
import type { LiveLayer } from '../lib/live-layers';
import type { PairFigures } from '../lib/pair-figures';
import { spread } from '../lib/spread';

interface Props {
  layers: readonly LiveLayer[];
  pairs: readonly PairFigures[];
  tops: readonly number[];
  heights: readonly number[];
  x: number;
  height: number;
}

/** A bracket at every plane pair, with its spacing. */
export function PairMarks({ layers, pairs, tops, heights, x, height }: Props) {
  const index = new Map(layers.map((layer, i) => [layer.name, i]));
  const marks = pairs.map((pair) => {
    const upper = index.get(pair.upper) ?? 0;
    const lower = index.get(pair.lower) ?? 0;
    return { pair, from: tops[upper], to: tops[lower] + heights[lower] };
  });
  const places = spread(
    marks.map(({ from, to }) => (from + to) / 2),
    16,
    8,
    height - 8,
  );
  return marks.map(({ pair, from, to }, i) => (
    <g key={pair.id}>
      <path d={`M${x - 3} ${from + 0.5}h4V${to - 0.5}h-4`} fill="none" className="stroke-ink" />
      <text x={x + 9} y={places[i] + 4} className="fill-ink">
        {thicknessText(pair.spacing_m)}
      </text>
    </g>
  ));
}
