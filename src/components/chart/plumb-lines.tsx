import { type FrequencyAxis, xOf } from './axis';

interface PlumbLinesProps {
  axis: FrequencyAxis;
  /** Peaks that break the surface: a dotted line falls from each through the strips. */
  frequencies_Hz: readonly number[];
  /** Where the pointer is, if it is over the score. */
  cursor_Hz: number | null;
}

/** Lines that fall from the chart through everything that shares its axis. */
export function PlumbLines({ axis, frequencies_Hz, cursor_Hz }: PlumbLinesProps) {
  const inside = (f: number) => f >= axis.low_Hz && f <= axis.high_Hz;
  return (
    <div aria-hidden className="pointer-events-none absolute inset-0">
      {frequencies_Hz.filter(inside).map((f) => (
        <div
          key={f}
          className="absolute inset-y-0 w-0 border-l border-dotted border-kingfisher"
          style={{ left: xOf(axis, f) }}
        />
      ))}
      {cursor_Hz !== null && inside(cursor_Hz) && (
        <div
          className="absolute inset-y-0 w-0 border-l border-stone/70"
          style={{ left: xOf(axis, cursor_Hz) }}
        />
      )}
    </div>
  );
}
