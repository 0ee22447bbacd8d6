import { formatLength } from '@shared/units/format';
import { useId } from 'react';
import type { Side } from '../lib/recipe-mount';
import { sectionFrame } from '../lib/section-frame';
import type { SectionGeometry } from '../lib/section-geometry';
import { TraceHatch } from './hatch';
import { Barrel, PartEnds } from './section-bodies';
import { SectionMeasures } from './section-measures';
import { SectionNames } from './section-names';

interface Props {
  geometry: SectionGeometry;
  side: Side;
  width: number;
}

/** The mount cut along its current, unfolded and to scale: the two loops that cost inductance are filled. */
export function MountSection({ geometry, side, width }: Props) {
  const hatch = useId();
  const frame = sectionFrame(geometry, side, width);
  const { box } = frame;
  const { layers, vias, viaEnds, drill, surface, viaBottom, traceBottom, traces } = geometry;
  const whole = [0, geometry.width] as const;
  return (
    <svg
      role="img"
      aria-label={`section of the mount: vias ${formatLength((vias[1] - vias[0]) / 1000)} apart, ${formatLength((viaBottom - surface) / 1000)} deep`}
      width={width}
      height={frame.height}
      className="block text-small"
      fill="none"
    >
      <defs>
        <TraceHatch id={hatch} />
      </defs>
      <rect {...box(whole, [surface, geometry.depth])} className="fill-wash" />
      {layers
        .slice(1)
        .map(({ layer, from, to }) =>
          layer.kind === 'copper' && layer.use === 'signal' ? (
            <rect key={layer.name} {...box(whole, [from, to])} className="fill-stone" fillOpacity="0.28" />
          ) : null,
        )}
      {viaBottom > surface && (
        <rect {...box(vias, [surface, viaBottom])} className="fill-shallow stroke-deep" />
      )}
      {traces.map((trace) => (
        <rect
          key={trace[0]}
          {...box(trace, [surface, traceBottom])}
          fill={`url(#${hatch})`}
          className="stroke-deep"
        />
      ))}
      {layers.map(({ layer, from, to, copper }) =>
        copper.map((span) => (
          <rect key={`${layer.name} ${span[0]}`} {...box(span, [from, to])} className="fill-deep" />
        )),
      )}
      {vias.map((via, i) => (
        <Barrel
          key={via}
          beyond={box([via - drill / 2, via + drill / 2], [0, geometry.depth])}
          used={box([via - drill / 2, via + drill / 2], [0, viaEnds[i]])}
        />
      ))}
      {[...geometry.pads, ...traces, ...geometry.rings].map((span) => (
        <rect key={`${span[0]} ${span[1]}`} {...box(span, [0, surface])} className="fill-ink" />
      ))}
      <PartEnds geometry={geometry} frame={frame} />
      <SectionNames geometry={geometry} frame={frame} />
      <SectionMeasures geometry={geometry} frame={frame} />
    </svg>
  );
}
