import type { Rows } from './rows';

/**
 * **Sectors.** For a > 0 write U = (a·Y + p)/Zt: the condition is |U| ≥ 1, Y outside a disk seen from its centre (condition.ts).
 * The outside of a disk is not convex, but within a sector θ₁ ≤ arg U ≤ θ₂ of half-width h < 90° around θ it implies
 *   Re(U·e^(−jθ)) = |U|·cos(arg U − θ) ≥ cos h      (beyond the chord)
 *   Re(U·e^(−j(θ₁+90°))) ≥ 0, Re(U·e^(−j(θ₂−90°))) ≥ 0  (inside the cone),
 * three linear functions of Y, hence of the mix. Sectors that cover all directions split a node without losing a solution;
 * each child is again a linear programme, and one that knows the phase: what an anti-resonance hides from any bound on
 * magnitudes is that on one side of it the bank is inductive and on the other capacitive.
 */
export interface Sector {
  from: number;
  to: number;
}

/** Worth of the three conditions of `sector` at U = (ux, uy): chord, lower edge, upper edge of the cone, into `out[0..2]`. */
export function sectorWorth({ from, to }: Sector, ux: number, uy: number, out: Float64Array): void {
  const middle = 0.5 * (from + to);
  out[0] = Math.cos(middle) * ux + Math.sin(middle) * uy - Math.cos(0.5 * (to - from));
  out[1] = Math.cos(from) * uy - Math.sin(from) * ux;
  out[2] = Math.sin(to) * ux - Math.cos(to) * uy;
}

/** U of row `f` at Y = x + jy, into `out[0..1]`. */
export function towards(rows: Rows, f: number, x: number, y: number, out: Float64Array): void {
  out[0] = (rows.a[f] * x + rows.px[f]) / rows.zt[f];
  out[1] = (rows.a[f] * y + rows.py[f]) / rows.zt[f];
}

/**
 * The smallest range of directions that holds all given points U (x, y alternating), whole circle if they surround the centre.
 * If one gap between neighbouring directions is more than half a turn, the hull of the points lies in the cone over the rest, so
 * no mix of them points elsewhere. A little is added on both sides for rounding.
 */
export function directionRange(points: ArrayLike<number>): Sector {
  const angles: number[] = [];
  for (let i = 0; i < points.length; i += 2)
    if (points[i] !== 0 || points[i + 1] !== 0) angles.push(Math.atan2(points[i + 1], points[i]));
    else return { from: -Math.PI, to: Math.PI };
  angles.sort((a, b) => a - b);
  let widest = angles[0] + 2 * Math.PI - angles[angles.length - 1];
  let after = 0;
  for (let i = 1; i < angles.length; i++)
    if (angles[i] - angles[i - 1] > widest) {
      widest = angles[i] - angles[i - 1];
      after = i;
    }
  if (widest <= Math.PI + 1e-6) return { from: -Math.PI, to: Math.PI };
  const from = angles[after] - 1e-9;
  return { from, to: from + 2 * Math.PI - widest + 2e-9 };
}

/** First split: equal sectors of at most `widest`; later ones are halves. */
export function splitSector({ from, to }: Sector, widest: number): Sector[] {
  const count = Math.max(2, Math.ceil((to - from) / widest - 1e-9));
  const step = (to - from) / count;
  return Array.from({ length: count }, (_, i) => ({ from: from + i * step, to: from + (i + 1) * step }));
}
