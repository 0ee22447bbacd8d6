import { memo } from 'react';
import { type FrequencyAxis, xOf } from './axis';

interface ShareStripProps {
  axis: FrequencyAxis;
  frequency_Hz: Float64Array;
  /** |share| of the load current, 1 = all of it. */
  share: Float64Array;
  /** A second strip drawn as a dashed line, e.g. of the present bank under a preview. */
  ghost?: { frequency_Hz: Float64Array; share: Float64Array };
  tone: 'line' | 'source';
  label: string;
}

export const STRIP_HEIGHT = 30;
/** Below this share a line does nothing that could be seen: the strip stays blank. */
const NOTHING = 0.002;
/** All of the current, with room for rounding: a line that carries it alone passes nothing back and forth. */
const WHOLE = 1 + 1e-6;

/**
 * A line's share of the load current, drawn on the chart's own axis. Full height is the whole current; where two lines
 * pass more than that back and forth (anti-resonance), the strip is capped with a bar.
 */
export const ShareStrip = memo(function ShareStrip({
  axis,
  frequency_Hz,
  share,
  ghost,
  tone,
  label,
}: ShareStripProps) {
  if (axis.width <= 0) return <div style={{ height: STRIP_HEIGHT }} />;
  return (
    <svg
      role="img"
      aria-label={label}
      width={axis.width}
      height={STRIP_HEIGHT}
      className="block overflow-hidden"
    >
      <path
        d={area(axis, frequency_Hz, share)}
        className={tone === 'source' ? 'fill-shallow' : 'fill-deep'}
        fillOpacity={tone === 'source' ? 1 : 0.88}
      />
      <path d={caps(axis, frequency_Hz, share)} className="stroke-brass" strokeWidth="3" fill="none" />
      {ghost && (
        <path
          d={outline(axis, ghost.frequency_Hz, ghost.share)}
          className="stroke-stone"
          strokeWidth="1.2"
          strokeDasharray="4 3"
          fill="none"
        />
      )}
    </svg>
  );
});

const height = (value: number) => STRIP_HEIGHT * (1 - Math.min(1, value));

/** Points of the strip, at most one a pixel and a half, those at the extremes kept. */
function* points(axis: FrequencyAxis, frequency_Hz: Float64Array, share: Float64Array) {
  let last = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < frequency_Hz.length; i++) {
    const x = xOf(axis, frequency_Hz[i]);
    const isTurn =
      i > 0 &&
      i + 1 < share.length &&
      share[i] >= share[i - 1] &&
      share[i] >= share[i + 1] &&
      share[i] > NOTHING;
    if (x - last < 1.5 && !isTurn && i + 1 < frequency_Hz.length) continue;
    last = x;
    yield [x, share[i]] as const;
  }
}

function area(axis: FrequencyAxis, frequency_Hz: Float64Array, share: Float64Array): string {
  let path = '';
  let open = false;
  let end = 0;
  for (const [x, value] of points(axis, frequency_Hz, share)) {
    if (value > NOTHING) {
      if (!open) path += `M${x.toFixed(1)} ${STRIP_HEIGHT}`;
      open = true;
      path += `L${x.toFixed(1)} ${height(value).toFixed(1)}`;
      end = x;
    } else if (open) {
      path += `L${end.toFixed(1)} ${STRIP_HEIGHT}Z`;
      open = false;
    }
  }
  return open ? `${path}L${end.toFixed(1)} ${STRIP_HEIGHT}Z` : path;
}

function outline(axis: FrequencyAxis, frequency_Hz: Float64Array, share: Float64Array): string {
  let path = '';
  for (const [x, value] of points(axis, frequency_Hz, share))
    path += `${path === '' ? 'M' : 'L'}${x.toFixed(1)} ${height(value).toFixed(1)}`;
  return path;
}

function caps(axis: FrequencyAxis, frequency_Hz: Float64Array, share: Float64Array): string {
  let path = '';
  let start: number | null = null;
  let previous = 0;
  for (let i = 0; i < share.length; i++) {
    const x = xOf(axis, frequency_Hz[i]);
    if (share[i] > WHOLE && start === null) start = x;
    if (share[i] <= WHOLE && start !== null) {
      path += `M${start.toFixed(1)} 1.5H${Math.max(previous, start + 1).toFixed(1)}`;
      start = null;
    }
    previous = x;
  }
  if (start !== null) path += `M${start.toFixed(1)} 1.5H${previous.toFixed(1)}`;
  return path;
}
