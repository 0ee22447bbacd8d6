import { EngineError } from '../errors';
import { finite } from './checks';
import type { CurvePoints } from './part-behaviour';

/**
 * A smooth curve through points that rises and falls only where they do: piecewise cubic with limited slopes, level beyond both
 * ends. Takes at least two points [x, y] with x rising and gives y(x) in the points' own units; throws EngineError naming
 * `field[i]`. Source: F. N. Fritsch, R. E. Carlson, SIAM J. Numer. Anal. 17(2) 238–246, 1980 (circle of radius 3).
 */
export function monotoneCubic(points: CurvePoints, field: string): (x: number) => number {
  if (points.length < 2) throw new EngineError(field, 'a curve needs at least two points');
  const x = points.map((point, i) => finite(`${field}[${i}]`, point[0]));
  const y = points.map((point, i) => finite(`${field}[${i}]`, point[1]));
  for (let i = 1; i < x.length; i++)
    if (!(x[i] > x[i - 1])) throw new EngineError(`${field}[${i}]`, 'must rise from point to point');
  const slope = limitedSlopes(x, y);
  const last = x.length - 1;
  return (at) => {
    if (Number.isNaN(at)) throw new EngineError(field, 'is asked for at a place that is not a number');
    if (at <= x[0]) return y[0];
    if (at >= x[last]) return y[last];
    let i = 0;
    while (at >= x[i + 1]) i++;
    const h = x[i + 1] - x[i];
    const t = (at - x[i]) / h;
    const s = 1 - t;
    // Cubic Hermite basis, written so that the two weights of y add up to 1 exactly where both y are alike.
    const value =
      y[i] + (y[i + 1] - y[i]) * t * t * (3 - 2 * t) + h * t * s * (s * slope[i] - t * slope[i + 1]);
    // The limited slopes keep the curve between its neighbours; rounding must not take it out again.
    return Math.min(Math.max(value, Math.min(y[i], y[i + 1])), Math.max(y[i], y[i + 1]));
  };
}

/** Slopes at the points, cut down until no piece overshoots. */
function limitedSlopes(x: readonly number[], y: readonly number[]): number[] {
  const pieces = x.length - 1;
  const secant = Array.from({ length: pieces }, (_, i) => (y[i + 1] - y[i]) / (x[i + 1] - x[i]));
  const slope = x.map((_, i) => {
    if (i === 0) return secant[0];
    if (i === pieces) return secant[pieces - 1];
    return secant[i - 1] * secant[i] <= 0 ? 0 : (secant[i - 1] + secant[i]) / 2;
  });
  for (let i = 0; i < pieces; i++) {
    if (secant[i] === 0) {
      slope[i] = 0;
      slope[i + 1] = 0;
      continue;
    }
    const length = Math.hypot(slope[i] / secant[i], slope[i + 1] / secant[i]);
    if (length > 3) {
      slope[i] *= 3 / length;
      slope[i + 1] *= 3 / length;
    }
  }
  return slope;
}
