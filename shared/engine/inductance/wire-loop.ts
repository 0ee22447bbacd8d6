import { MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { positive } from './checks';

/** Where the current flows: on the wire's surface (high frequency) or evenly through it (low), which adds to each metre. */
export type CurrentIn = 'surface' | 'uniform';

/** Internal inductance of a round wire with even current, H/m: μ₀/8π, whatever its radius (textbook). */
export const INTERNAL_H_PER_M = MU0_H_PER_M / (8 * Math.PI);

const internal = (current: CurrentIn, length_m: number): number =>
  current === 'uniform' ? INTERNAL_H_PER_M * length_m : 0;

/**
 * Rectangle of round wire with sides a and b (between centres) and wire radius r, metres in, henry out:
 * (μ₀/π)·[a ln(2a/r) + b ln(2b/r) − a asinh(a/b) − b asinh(b/a) + 2√(a² + b²) − 2(a + b)]. Throws EngineError for sizes of zero or
 * less and a wire thicker than the rectangle.
 * Source: E. B. Rosa, Bull. Bureau of Standards 4(2) 301–344, 1908; F. W. Grover, Inductance Calculations, 1946, ch. 8 (58).
 */
export function rectangularLoop_H(
  a_m: number,
  b_m: number,
  wireRadius_m: number,
  current: CurrentIn = 'surface',
): number {
  const [a, b, r] = [positive('a_m', a_m), positive('b_m', b_m), positive('wireRadius_m', wireRadius_m)];
  if (!(2 * r < Math.min(a, b)))
    throw new EngineError('wireRadius_m', 'the wire is thicker than the rectangle');
  const sides = a * Math.log((2 * a) / r) + b * Math.log((2 * b) / r);
  const opposite = a * Math.asinh(a / b) + b * Math.asinh(b / a);
  const ends = 2 * Math.hypot(a, b) - 2 * (a + b);
  return (MU0_H_PER_M / Math.PI) * (sides - opposite + ends) + internal(current, 2 * (a + b));
}

/**
 * Circle of radius R of round wire with radius a, metres in, henry out: μ₀R·(ln(8R/a) − 2), for thin wire. Throws EngineError for
 * sizes of zero or less and a wire thicker than half the loop. Source: circular loop, surface current (textbook).
 */
export function circularLoop_H(
  loopRadius_m: number,
  wireRadius_m: number,
  current: CurrentIn = 'surface',
): number {
  const [R, a] = [positive('loopRadius_m', loopRadius_m), positive('wireRadius_m', wireRadius_m)];
  if (!(2 * a < R)) throw new EngineError('wireRadius_m', 'the wire is too thick for the loop');
  return MU0_H_PER_M * R * (Math.log((8 * R) / a) - 2) + internal(current, 2 * Math.PI * R);
}
