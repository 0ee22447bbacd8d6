import { thicknessText } from '../lib/length-text';
import { scaleBar } from '../lib/scale-bar';
import type { SectionFrame } from '../lib/section-frame';
import type { SectionGeometry } from '../lib/section-geometry';
import { spread } from '../lib/spread';

interface Props {
  geometry: SectionGeometry;
  frame: SectionFrame;
}

/** Millimetres of the drawing as a length in words, three digits will do. */
const words = (mm: number): string => thicknessText(Number((mm / 1000).toPrecision(3)));

/** Depths at the left, lengths under the board, and the scale. */
export function SectionMeasures({ geometry, frame }: Props) {
  const { surface, traceBottom, viaBottom, traces, vias } = geometry;
  const depths = [
    ...(traces.length > 0 ? [{ letter: 'h', to: traceBottom }] : []),
    ...(viaBottom > surface ? [{ letter: 'D', to: viaBottom }] : []),
  ];
  const places = spread(
    depths.map(({ to }) => (frame.z(surface) + frame.z(to)) / 2).sort((a, b) => a - b),
    15,
    7,
    frame.height - 20,
  );
  const order = frame.isTop ? depths : depths.toReversed();
  const left = frame.x(0);
  const foot = frame.height - 18;
  const bar = scaleBar(frame.scale * 1000, 64);
  const lengths = [
    ...(traces.length > 0 ? [{ text: 'l', span: traces[0] }] : []),
    { text: 's', span: vias },
    ...(traces.length > 0 ? [{ text: 'l', span: traces[1] }] : []),
  ];
  return (
    <g className="stroke-stone">
      {order.map(({ letter, to }, i) => {
        const at = left - 6 - 7 * i;
        return (
          <g key={letter}>
            <path d={`M${at + 3} ${frame.z(surface)}h-6M${at} ${frame.z(surface)}V${frame.z(to)}m3 0h-6`} />
            <text x={left - 24} y={places[i] + 4} textAnchor="end" className="fill-ink" stroke="none">
              {letter} {words(to - surface)}
            </text>
          </g>
        );
      })}
      {lengths.map(({ text, span }) => (
        <g key={`${text} ${span[0]}`}>
          <path d={`M${frame.x(span[0])} ${foot - 3}v6m0 -3H${frame.x(span[1])}m0 -3v6`} />
          <text
            x={(frame.x(span[0]) + frame.x(span[1])) / 2}
            y={foot + 14}
            textAnchor="middle"
            className="fill-ink"
            stroke="none"
          >
            {text}
          </text>
        </g>
      ))}
      <path d={`M2 ${foot - 3}v6m0 -3h${bar.px}m0 -3v6`} className="stroke-ink" />
      <text x={2} y={foot + 14} className="fill-stone" stroke="none">
        {thicknessText(bar.length_m)}
      </text>
    </g>
  );
}
