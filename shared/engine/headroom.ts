import { type Curve, sweepCurve } from './curve';
import { EngineError } from './errors';
import { localMaxima } from './maxima';
import { logImpedance } from './peaks';
import { type CompiledRail, railImpedance, scratch } from './rail';
import { type TargetMask, targetAt, targetSegment } from './target';

/** Where the rail is closest to its target, or furthest above it. */
export interface Tightest {
  frequency_Hz: number;
  impedance_ohm: number;
  target_ohm: number;
  /** 20·log10(target ÷ |Z|); negative: the rail is short by so much. */
  headroom_dB: number;
}

/** |Z| may exceed the target by this relative amount and still count as holding: the engine's own accuracy. */
export const HOLD_TOLERANCE = 1e-9;

/** A sample this little above every peak is rounding (nepers). */
const LEVEL_NP = 1e-9;

/** True when |Z| ≤ target at the tightest frequency (within HOLD_TOLERANCE). */
export function holds(tightest: Tightest): boolean {
  return tightest.impedance_ohm <= tightest.target_ohm * (1 + HOLD_TOLERANCE);
}

/**
 * The tightest frequency over the band: exact at the refined maxima of |Z|/Z_t, the band's edges and the mask's
 * corners, not only at grid points. Throws EngineError for an empty band.
 */
export function tightestHeadroom(
  rail: CompiledRail,
  band_Hz: readonly [number, number],
  target: TargetMask,
): Tightest {
  return surfaceMaxima(rail, band_Hz, target).reduce((worst, next) =>
    next.headroom_dB < worst.headroom_dB ? next : worst,
  );
}

/** Every local maximum of |Z|/Z_t over the band, by rising frequency: what breaks the surface is among them. */
export function surfaceMaxima(
  rail: CompiledRail,
  band_Hz: readonly [number, number],
  target: TargetMask,
  curve?: Curve,
): Tightest[] {
  const [low, high] = band_Hz;
  if (!(high > low)) throw new EngineError('band_Hz', 'the band is empty: its end must lie above its start');
  const corners = Array.from(target.frequency_Hz).filter((f) => f > low && f < high);
  const swept = curve ?? sweepCurve(rail, low, high, { include_Hz: corners });
  const u = swept.frequency_Hz.map(Math.log);
  const segments = Array.from(swept.frequency_Hz, (f) => targetSegment(target, f));
  const z = logImpedance(rail);
  const value = swept.logMagnitude.map((v, i) => v - segments[i].logValue);
  const maxima = localMaxima({
    u,
    value,
    slope: swept.slope.map((v, i) => v - segments[i].slope),
    at: (place) => {
      const curveAt = z(place);
      const line = targetSegment(target, Math.exp(place));
      return { value: curveAt.value - line.logValue, slope: curveAt.slope - line.slope };
    },
  });
  const places = maxima.map((maximum) => frequencyOf(maximum, low, high));
  // A level stretch that runs to the band's end is no peak, and may still be the highest there is: the highest sample counts
  // whatever the peaks say, so that no rail is called holding for want of one.
  const highest = value.reduce((best, v, i) => (v > value[best] ? i : best), 0);
  const peak = maxima.reduce((most, maximum) => Math.max(most, maximum.value), Number.NEGATIVE_INFINITY);
  if (value[highest] > peak + LEVEL_NP) places.push(swept.frequency_Hz[highest]);
  places.sort((a, b) => a - b);
  return places.map((f) => tightnessAt(rail, target, f));
}

function frequencyOf(maximum: { u: number; edge: 'low' | 'high' | null }, low: number, high: number): number {
  if (maximum.edge === 'low') return low;
  if (maximum.edge === 'high') return high;
  return Math.min(high, Math.max(low, Math.exp(maximum.u)));
}

/** |Z|, target and headroom at one frequency. */
export function tightnessAt(rail: CompiledRail, target: TargetMask, frequency_Hz: number): Tightest {
  const out = scratch();
  railImpedance(rail, frequency_Hz, out);
  const impedance_ohm = Math.hypot(out[0], out[1]);
  const target_ohm = targetAt(target, frequency_Hz);
  return {
    frequency_Hz,
    impedance_ohm,
    target_ohm,
    headroom_dB: 20 * Math.log10(target_ohm / impedance_ohm),
  };
}
