import { ROOM, type SectionFrame } from '../lib/section-frame';
import type { SectionGeometry } from '../lib/section-geometry';
import { spread } from '../lib/spread';

const MOST = 13;
const shortened = (text: string) => (text.length > MOST ? `${text.slice(0, MOST - 1)}…` : text);

/** The coppers' names in the right margin, led to where they lie. */
export function SectionNames({ geometry, frame }: { geometry: SectionGeometry; frame: SectionFrame }) {
  const coppers = geometry.layers
    .filter(({ layer }) => layer.kind === 'copper')
    .map((one) => ({ ...one, y: frame.z((one.from + one.to) / 2) }))
    .sort((a, b) => a.y - b.y);
  const places = spread(
    coppers.map(({ y }) => y),
    15,
    7,
    frame.height - ROOM.foot + 8,
  );
  const edge = frame.x(geometry.width);
  return coppers.map(({ layer, y }, i) => (
    <g key={layer.name}>
      <path d={`M${edge} ${y}h4L${edge + 16} ${places[i]}h3`} className="stroke-stone" strokeOpacity="0.6" />
      <text
        x={edge + 22}
        y={places[i] + 4}
        className={isPlane(layer) ? 'fill-ink font-semibold' : 'fill-stone'}
      >
        {shortened(layer.label)}
      </text>
    </g>
  ));
}

const isPlane = (layer: SectionGeometry['layers'][number]['layer']): boolean =>
  layer.kind === 'copper' && layer.use === 'plane';
