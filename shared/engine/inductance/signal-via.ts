import { MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { positive, wholeCount } from './checks';

function factor(height_m: number, distance_m: number, diameter_m: number): [perNeper: number, ln: number] {
  positive('height_m', height_m);
  positive('diameter_m', diameter_m);
  if (!(positive('distance_m', distance_m) > diameter_m))
    throw new EngineError('distance_m', 'must be wider than the diameter');
  return [(MU0_H_PER_M * height_m) / (2 * Math.PI), Math.log((2 * distance_m) / diameter_m)];
}

/**
 * Loop of one via with n return vias evenly round it that share the return current, henry: with height h, distance S from centre
 * to each return and diameter D of all, in metres, (μ₀h/2π)·((1 + 1/n)·ln(2S/D) − ln(n)/n).
 *
 * Derivation: the flux between the via and one return is that of the via itself, ln(2S/D), of that return, ln(2S/D)/n, and of the
 * n − 1 others, each ln(S/a)/n at distance a from it; the product of these a is n·S^(n−1) (chords of a regular polygon). n = 1 is
 * the pair of thin wires. (An archived message of 2001 prints + 0.5 ln 2 for n = 2; that does not check out.)
 * Throws EngineError for sizes of zero or less, vias that touch, and a count that is not whole.
 */
export function signalVia_H(
  height_m: number,
  distance_m: number,
  diameter_m: number,
  returns: number,
): number {
  const [perNeper, ln] = factor(height_m, distance_m, diameter_m);
  const n = wholeCount('returns', returns);
  if (n > 1 && !(2 * distance_m * Math.sin(Math.PI / n) > diameter_m))
    throw new EngineError('returns', 'so many returns touch each other at this distance');
  return perNeper * ((1 + 1 / n) * ln - Math.log(n) / n);
}

/**
 * The same with a closed cylinder of radius S for a return, henry: (μ₀h/2π)·ln(2S/D), which many returns come near to. Throws
 * EngineError for sizes of zero or less and for S not above D. Source: coaxial line (textbook).
 */
export function coaxVia_H(height_m: number, distance_m: number, diameter_m: number): number {
  const [perNeper, ln] = factor(height_m, distance_m, diameter_m);
  return perNeper * ln;
}
