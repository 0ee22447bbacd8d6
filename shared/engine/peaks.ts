import { type Curve, type CurveOptions, sweepCurve } from './curve';
import { makersAt } from './makers';
import { localMaxima } from './maxima';
import { type CompiledRail, nodeAdmittance, railImpedance, scratch } from './rail';

/** A local maximum of |Z|. */
export interface Peak {
  frequency_Hz: number;
  impedance_ohm: number;
  /** Set when it is not a resonance but the end of the span, where |Z| rises outwards. */
  edge: 'low' | 'high' | null;
  /** The two that make it, by name (makers.ts); null at an edge without a partner. */
  inductive: string | null;
  capacitive: string | null;
  /** Q = ω·|dB/dω| / (2G) of the node, from Y = G + jB at the peak; null at an edge. */
  q: number | null;
}

/** Value and slope of ln|Z| over u = ln f, for the refinement of extrema. */
export function logImpedance(rail: CompiledRail): (u: number) => { value: number; slope: number } {
  const out = scratch();
  return (u) => {
    railImpedance(rail, Math.exp(u), out);
    const m2 = out[0] * out[0] + out[1] * out[1];
    return { value: 0.5 * Math.log(m2), slope: (out[0] * out[2] + out[1] * out[3]) / m2 };
  };
}

/**
 * All peaks of |Z| over [low_Hz, high_Hz], by rising frequency. Frequencies are good to 1e-9 and heights to 1e-12
 * relative (well inside the 1e-6 and 1e-9 promised). The two lines that make a peak are the ones that carry the
 * largest inductive and the largest capacitive current there.
 */
export function findPeaks(
  rail: CompiledRail,
  low_Hz: number,
  high_Hz: number,
  options?: CurveOptions,
): Peak[] {
  return peaksOfCurve(rail, sweepCurve(rail, low_Hz, high_Hz, options));
}

/** As `findPeaks`, from a sweep that is already there. */
export function peaksOfCurve(rail: CompiledRail, curve: Curve): Peak[] {
  const at = logImpedance(rail);
  const u = curve.frequency_Hz.map(Math.log);
  const n = u.length;
  return localMaxima({ u, value: curve.logMagnitude, slope: curve.slope, at }).map(({ u: place, edge }) => {
    const end =
      edge === 'low' ? curve.frequency_Hz[0] : edge === 'high' ? curve.frequency_Hz[n - 1] : Math.exp(place);
    return { ...describePeak(rail, end, edge !== null), edge };
  });
}

function describePeak(rail: CompiledRail, frequency_Hz: number, isEdge: boolean): Omit<Peak, 'edge'> {
  const out = scratch();
  railImpedance(rail, frequency_Hz, out);
  const impedance_ohm = Math.hypot(out[0], out[1]);
  let q: number | null = null;
  if (!isEdge) {
    nodeAdmittance(rail, frequency_Hz, out);
    q = out[0] > 0 ? Math.abs(out[3]) / (2 * out[0]) : Number.POSITIVE_INFINITY;
  }
  return { frequency_Hz, impedance_ohm, ...makersAt(rail, frequency_Hz), q };
}
