import type { MountSegment } from '@shared/engine/inductance/mount';
import { useId } from 'react';
import { TraceHatch } from './hatch';

interface Props {
  segments: readonly MountSegment[];
  /** What the whole width stands for, henry. */
  full_H: number;
  height: number;
  /** Places of hairlines behind the bar, henry. */
  ticks?: readonly number[];
}

const percent = (part: number, whole: number) => `${(100 * part) / whole}%`;

/** A mount's inductance as a bar, the traces' share hatched, the vias' plain; its figures stand beside it. */
export function MountBar({ segments, full_H, height, ticks = [] }: Props) {
  const hatch = useId();
  const starts = segments.map((_, i) => segments.slice(0, i).reduce((sum, one) => sum + one.inductance_H, 0));
  return (
    <svg aria-hidden="true" width="100%" height={height} className="block overflow-visible">
      <defs>
        <TraceHatch id={hatch} />
      </defs>
      {ticks.map((tick) => (
        <line
          key={tick}
          x1={percent(tick, full_H)}
          x2={percent(tick, full_H)}
          y1={-3}
          y2={height + 3}
          className={tick === 0 ? 'stroke-stone' : 'stroke-hairline'}
        />
      ))}
      {segments.map((segment, i) =>
        segment.inductance_H > 0 ? (
          <rect
            key={segment.part}
            x={percent(starts[i], full_H)}
            width={percent(segment.inductance_H, full_H)}
            y="0.5"
            height={height - 1}
            fill={segment.part === 'traces' ? `url(#${hatch})` : 'var(--shallow)'}
            className="stroke-deep"
          />
        ) : null,
      )}
    </svg>
  );
}

/** A patch of the sign, for a key. */
export function SegmentSign({ part }: { part: MountSegment['part'] }) {
  const hatch = useId();
  return (
    <svg aria-hidden="true" width="20" height="12" className="block shrink-0">
      <defs>
        <TraceHatch id={hatch} />
      </defs>
      <rect
        x="0.5"
        y="0.5"
        width="19"
        height="11"
        fill={part === 'traces' ? `url(#${hatch})` : 'var(--shallow)'}
        className="stroke-deep"
      />
    </svg>
  );
}
