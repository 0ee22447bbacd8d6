import { type Curve, sweepCurve } from './curve';
import { EngineError } from './errors';
import { localMaxima, refineMaximum, type Sampled } from './maxima';
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
  const surface = surfaceOver(rail, band_Hz, target);
  const { u, value, slope } = surface;
  let place = 0;
  for (let i = 1; i < value.length; i++) if (value[i] > value[place]) place = i;
  let best = value[place];
  let frequency_Hz = surface.frequency_Hz[place];
  for (let i = 0; i + 1 < value.length; i++) {
    if (!(slope[i] > 0 && slope[i + 1] <= 0) || summit(surface, i) + SUMMIT_NP < best) continue;
    const top = refineMaximum(surface, i);
    if (top.value <= best) continue;
    best = top.value;
    frequency_Hz = Math.min(Math.exp(u[i + 1]), Math.max(Math.exp(u[i]), Math.exp(top.u)));
  }
  return tightnessAt(rail, target, frequency_Hz);
}

/** A sweep's intervals follow their cubic to 5e-4 Np (curve.ts); a top whose cubic lies further than this below the best is none. */
const SUMMIT_NP = 0.01;

/** Highest of the cubic through both ends of an interval, seen at eight places. */
function summit({ u, value, slope }: Sampled, i: number): number {
  const h = u[i + 1] - u[i];
  let most = Math.max(value[i], value[i + 1]);
  for (let k = 1; k < 8; k++) {
    const t = k / 8;
    const s = 1 - t;
    const cubic =
      s * s * (1 + 2 * t) * value[i] +
      t * t * (1 + 2 * s) * value[i + 1] +
      h * t * s * (s * slope[i] - t * slope[i + 1]);
    if (cubic > most) most = cubic;
  }
  return most;
}

/** ln(|Z|/Z_t) over the band, sampled and anywhere in between. */
function surfaceOver(
  rail: CompiledRail,
  [low, high]: readonly [number, number],
  target: TargetMask,
  curve?: Curve,
): Sampled & { frequency_Hz: Float64Array; value: Float64Array } {
  if (!(high > low)) throw new EngineError('band_Hz', 'the band is empty: its end must lie above its start');
  const corners = Array.from(target.frequency_Hz).filter((f) => f > low && f < high);
  const swept = curve ?? sweepCurve(rail, low, high, { include_Hz: corners });
  const segments = Array.from(swept.frequency_Hz, (f) => targetSegment(target, f));
  const z = logImpedance(rail);
  return {
    frequency_Hz: swept.frequency_Hz,
    u: swept.frequency_Hz.map(Math.log),
    value: swept.logMagnitude.map((v, i) => v - segments[i].logValue),
    slope: swept.slope.map((v, i) => v - segments[i].slope),
    at: (place) => {
      const curveAt = z(place);
      const line = targetSegment(target, Math.exp(place));
      return { value: curveAt.value - line.logValue, slope: curveAt.slope - line.slope };
    },
  };
}

/** Every local maximum of |Z|/Z_t over the band, by rising frequency: what breaks the surface is among them. */
export function surfaceMaxima(
  rail: CompiledRail,
  band_Hz: readonly [number, number],
  target: TargetMask,
  curve?: Curve,
): Tightest[] {
  const [low, high] = band_Hz;
  const surface = surfaceOver(rail, band_Hz, target, curve);
  const { value } = surface;
  const maxima = localMaxima(surface);
  const places = maxima.map((maximum) => frequencyOf(maximum, low, high));
  // A level stretch that runs to the band's end is no peak, and may still be the highest there is: the highest sample counts
  // whatever the peaks say, so that no rail is called holding for want of one.
  const highest = value.reduce((best, v, i) => (v > value[best] ? i : best), 0);
  const peak = maxima.reduce((most, maximum) => Math.max(most, maximum.value), Number.NEGATIVE_INFINITY);
  if (value[highest] > peak + LEVEL_NP) places.push(surface.frequency_Hz[highest]);
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
