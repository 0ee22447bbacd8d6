import { MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { pathInductance } from '../plane';
import { positive } from './checks';

/** Inductance of a plane pair in henry per square: μ₀h, with the spacing h in metres above zero (EngineError). Parallel-plate line. */
export const planeInductance_HPerSquare = (spacing_m: number): number =>
  MU0_H_PER_M * positive('spacing_m', spacing_m);

/**
 * Current straight along a strip of a plane pair, henry: μ₀h·length/width, metres; the field beyond the edges is left out. Throws
 * EngineError for a size of zero or less. Source: parallel-plate line.
 */
export const planeStrip_H = (spacing_m: number, length_m: number, width_m: number): number =>
  (planeInductance_HPerSquare(spacing_m) * positive('length_m', length_m)) / positive('width_m', width_m);

/**
 * Current spreading from a contact of radius r₁ to a ring of radius r₂ on a plane pair of spacing h, henry: (μ₀h/2π)·ln(r₂/r₁),
 * metres. Throws EngineError for a size of zero or less and r₂ below r₁. Source: radial parallel-plate line (textbook).
 */
export function spreading_H(spacing_m: number, inner_m: number, outer_m: number): number {
  const perNeper = planeInductance_HPerSquare(spacing_m) / (2 * Math.PI);
  positive('inner_m', inner_m);
  if (positive('outer_m', outer_m) < inner_m)
    throw new EngineError('outer_m', 'must not be below the inner radius');
  return perNeper * Math.log(outer_m / inner_m);
}

/**
 * Current from one contact to another at distance d on a wide plane pair, henry: (μ₀h/2π)·ln(d²/(r₁r₂)), metres; zero when nearer
 * than √(r₁r₂). As `pathInductance`, but a spacing of zero is refused too. Throws EngineError naming the argument.
 * Source: two radial flows superposed.
 */
export function spreadingBetween_H(
  spacing_m: number,
  distance_m: number,
  radius1_m: number,
  radius2_m: number,
): number {
  positive('spacing_m', spacing_m);
  positive('radius1_m', radius1_m);
  positive('radius2_m', radius2_m);
  if (distance_m !== 0) positive('distance_m', distance_m);
  return pathInductance(spacing_m, distance_m, radius1_m, radius2_m);
}
