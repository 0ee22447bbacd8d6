import { MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { notNegative, positive, wholeCount } from './checks';

/** Two centres so close that the barrels touch have no loop between them. */
function apart(spacing_m: number, diameter_m: number): number {
  positive('diameter_m', diameter_m);
  if (!(positive('spacing_m', spacing_m) > diameter_m))
    throw new EngineError('spacing_m', 'must be wider than the diameter');
  return spacing_m / diameter_m;
}

/**
 * Partial inductance of one via alone, henry: (μ₀h/2π)·(ln(4h/d) + 1), with height h and diameter d in metres; the textbook's
 * 5.08 h[ln(4h/d) + 1] nH with h in inch. Without its return path this is a rule of thumb, kept as a check. Throws EngineError
 * for sizes of zero or less and for a via so flat that the formula goes negative.
 * Source: H. Johnson, M. Graham, High-Speed Digital Design, 1993, sec. 7.3.
 */
export function singleVia_H(height_m: number, diameter_m: number): number {
  positive('height_m', height_m);
  const shape = Math.log((4 * height_m) / positive('diameter_m', diameter_m)) + 1;
  if (!(shape > 0)) throw new EngineError('height_m', 'is too small beside the diameter for this formula');
  return ((MU0_H_PER_M * height_m) / (2 * Math.PI)) * shape;
}

/**
 * Loop of two vias with opposite currents, henry: (μ₀h/π)·acosh(s/d), with height h, centre spacing s and diameter d in metres.
 * Exact for long round wires with the current on their surface, crowding towards each other included.
 * Throws EngineError for sizes of zero or less and for a spacing not above the diameter. Source: two-wire line (textbook).
 */
export function viaPair_H(height_m: number, spacing_m: number, diameter_m: number): number {
  return (
    ((MU0_H_PER_M * positive('height_m', height_m)) / Math.PI) * Math.acosh(apart(spacing_m, diameter_m))
  );
}

/** The same with thin wires: (μ₀h/π)·ln(2s/d), within 0.1 % of `viaPair_H` from s = 10 d on, higher when closer. Source: as there. */
export function viaPairLog_H(height_m: number, spacing_m: number, diameter_m: number): number {
  const ratio = apart(spacing_m, diameter_m);
  return ((MU0_H_PER_M * positive('height_m', height_m)) / Math.PI) * Math.log(2 * ratio);
}

/**
 * n equal via pairs in parallel, henry: L·(1 + (n − 1)k)/n, where each pair has L = `pair_H` alone and a mutual inductance of
 * k·L with every other. k = 0: they do not feel each other; k = 1: more pairs do not help. Throws EngineError for a negative L,
 * a count that is not whole, k outside 0 … 1. Source: n coupled inductors sharing the current evenly.
 */
export function parallelPairs_H(pair_H: number, pairs: number, coupling: number): number {
  notNegative('pair_H', pair_H);
  wholeCount('pairs', pairs);
  if (notNegative('coupling', coupling) > 1) throw new EngineError('coupling', 'must be at most 1');
  return (pair_H * (1 + (pairs - 1) * coupling)) / pairs;
}
