import { type Branch, branchAdmittance, sourceBranch } from '@shared/engine/branch';
import { EngineError } from '@shared/engine/errors';
import type { Source } from '@shared/schemas/rail-spec.schema';

/** |Z| of a source in ohm at each frequency; null where it has none: an open source, or one that the engine refuses. */
export function sourceMagnitude_ohm(source: Source, frequency_Hz: readonly number[]): number[] | null {
  const out = new Float64Array(4);
  try {
    const branch = branchOf(source);
    if (!branch) return null;
    return frequency_Hz.map((f) => {
      branchAdmittance(branch, f, out, 'source');
      return 1 / Math.hypot(out[0], out[1]);
    });
  } catch (error) {
    if (error instanceof EngineError) return null;
    throw error;
  }
}

function branchOf(source: Source): Branch | null {
  if (source.kind !== 'table') return sourceBranch(source);
  const { points } = source;
  const table = {
    frequency_Hz: Float64Array.from(points, (p) => p[0]),
    re_ohm: Float64Array.from(points, (p) => p[1]),
    im_ohm: Float64Array.from(points, (p) => p[2]),
  };
  return sourceBranch({ kind: 'table', table });
}

/** Frequencies from one end of a band to the other, evenly spaced on a logarithmic axis. */
export const spreadOver = ([low, high]: readonly [number, number], count: number): number[] =>
  Array.from({ length: count }, (_, i) => low * (high / low) ** (i / (count - 1)));
