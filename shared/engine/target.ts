import { EngineError } from './errors';

/** The waterline: points (Hz, ohm) joined by straight lines on log–log paper, held flat beyond its ends. */
export interface TargetMask {
  frequency_Hz: Float64Array;
  impedance_ohm: Float64Array;
}

/** A flat target of `impedance_ohm`. */
export function flatTarget(impedance_ohm: number): TargetMask {
  return maskTarget([[1, impedance_ohm]]);
}

/** Z = V · ripple / ΔI (ohm): the largest impedance at which a current step moves the rail by no more than its ripple. */
export function targetFromStep(voltage_V: number, ripple_percent: number, step_A: number): number {
  if (!(step_A > 0)) throw new EngineError('target.step_A', 'the load step must be above 0 A');
  return (voltage_V * ripple_percent) / 100 / step_A;
}

/**
 * Level up to `corner_Hz`, above it rising by 20 dB a decade: an inductive limit, or the counterpart of a load spectrum that falls
 * as fast. The rise goes on for nine decades, beyond any band.
 */
export function risingTarget(impedance_ohm: number, corner_Hz: number): TargetMask {
  return maskTarget([
    [corner_Hz, impedance_ohm],
    [corner_Hz * 1e9, impedance_ohm * 1e9],
  ]);
}

/** Where the spectrum of a trapezoidal load begins to fall by a further 20 dB a decade, Hz: 1/(π·t_r) (Ott 2009, ch. 11). */
export function spectrumCorner_Hz(rise_s: number): number {
  if (!(rise_s > 0)) throw new EngineError('rise_s', 'the rise time must be above zero');
  return 1 / (Math.PI * rise_s);
}

/** Builds a mask from [Hz, ohm] points; throws EngineError when they do not rise or are not positive. */
export function maskTarget(points: readonly (readonly [number, number])[]): TargetMask {
  if (points.length === 0) throw new EngineError('target.points', 'a mask needs at least one point');
  points.forEach(([f, z], i) => {
    if (!(f > 0) || !Number.isFinite(f))
      throw new EngineError(`target.points[${i}]`, 'frequency must be above 0 Hz and finite');
    if (!(z > 0) || !Number.isFinite(z))
      throw new EngineError(`target.points[${i}]`, 'impedance must be above 0 Ω and finite');
    if (i > 0 && f <= points[i - 1][0]) throw new EngineError(`target.points[${i}]`, 'frequencies must rise');
  });
  return {
    frequency_Hz: Float64Array.from(points, (p) => p[0]),
    impedance_ohm: Float64Array.from(points, (p) => p[1]),
  };
}

/** Target in ohm at one frequency. */
export function targetAt(mask: TargetMask, frequency_Hz: number): number {
  const { frequency_Hz: f, impedance_ohm: z } = mask;
  const last = f.length - 1;
  if (frequency_Hz <= f[0] || last === 0) return z[0];
  if (frequency_Hz >= f[last]) return z[last];
  return Math.exp(targetSegment(mask, frequency_Hz).logValue);
}

/** ln Z_t and its slope d ln Z_t / d ln f; at a corner the slope is that of the segment to the right. */
export function targetSegment(mask: TargetMask, frequency_Hz: number): { logValue: number; slope: number } {
  const { frequency_Hz: f, impedance_ohm: z } = mask;
  const last = f.length - 1;
  if (frequency_Hz < f[0] || last === 0) return { logValue: Math.log(z[0]), slope: 0 };
  if (frequency_Hz >= f[last]) return { logValue: Math.log(z[last]), slope: 0 };
  let i = 0;
  while (f[i + 1] <= frequency_Hz) i++;
  const slope = Math.log(z[i + 1] / z[i]) / Math.log(f[i + 1] / f[i]);
  return { logValue: Math.log(z[i]) + slope * Math.log(frequency_Hz / f[i]), slope };
}

/** Knee frequency of an edge in Hz: 0.35/t_r (10–90 % rise of a single pole), or another numerator such as 0.5. */
export function kneeFrequency(rise_s: number, numerator = 0.35): number {
  if (!(rise_s > 0)) throw new EngineError('rise_s', 'the rise time must be above zero');
  return numerator / rise_s;
}
