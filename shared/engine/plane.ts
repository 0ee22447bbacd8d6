import { C0_M_PER_S, EPS0_F_PER_M, MU0_H_PER_M } from './constants';
import { EngineError } from './errors';

/** Capacitance of a plane pair in farad: C = ε₀·εᵣ·A/h, fringes left out (they add about h·perimeter/A). */
export function planeCapacitance(
  length_m: number,
  width_m: number,
  spacing_m: number,
  relativePermittivity: number,
): number {
  if (!(spacing_m > 0)) throw new EngineError('plane.geometry.spacing_m', 'the spacing must be above zero');
  return (EPS0_F_PER_M * relativePermittivity * length_m * width_m) / spacing_m;
}

/** First cavity resonance along each side, Hz: f = c/(2a√εᵣ). Above the lower one a single node no longer holds. */
export function cavityResonances(
  length_m: number,
  width_m: number,
  relativePermittivity: number,
): [number, number] {
  const first = (side: number) => C0_M_PER_S / (2 * side * Math.sqrt(relativePermittivity));
  return [first(length_m), first(width_m)];
}

/**
 * Inductance in henry of the path on a plane pair between two contacts of effective radius r₁ and r₂ at a distance d:
 * L = (μ₀h/2π)·ln(d²/(r₁r₂)), from the field of two opposite line currents between wide planes; zero when closer than
 * √(r₁r₂), where the formula no longer means anything.
 */
export function pathInductance(
  spacing_m: number,
  distance_m: number,
  radius1_m: number,
  radius2_m: number,
): number {
  if (!(radius1_m > 0) || !(radius2_m > 0))
    throw new EngineError('plane.geometry', 'via radii must be above zero');
  if (distance_m < 0 || !Number.isFinite(distance_m))
    throw new EngineError('bank.distance_m', 'the distance must not be negative');
  const ratio = (distance_m * distance_m) / (radius1_m * radius2_m);
  return ratio <= 1 ? 0 : ((MU0_H_PER_M * spacing_m) / (2 * Math.PI)) * Math.log(ratio);
}
