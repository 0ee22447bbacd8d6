import { EngineError } from '../errors';
import { monotoneCubic } from './monotone-cubic';
import type { CurvePoints } from './part-behaviour';

/** A part's curve ready for look-up, and where its points begin and end. */
export interface FactorCurve {
  at: (x: number) => number;
  first: readonly [number, number];
  last: readonly [number, number];
  /** Rise from the last point but one to the last, per unit of x. */
  lastSlope: number;
}

/** Prepared curves by their points, which nobody changes: every corner of a rail asks for the same ones. */
const prepared = new WeakMap<CurvePoints, FactorCurve>();

/** Prepares a curve of capacitance factors; throws EngineError naming `field[i]` for what no curve can be or a factor of zero or less. */
export function factorCurve(points: CurvePoints, field: string): FactorCurve {
  const known = prepared.get(points);
  if (known) return known;
  const at = monotoneCubic(points, field);
  points.forEach(([, factor], i) => {
    if (!(factor > 0)) throw new EngineError(`${field}[${i}]`, 'the factor must be above zero');
  });
  const last = points[points.length - 1];
  const before = points[points.length - 2];
  const curve = { at, first: points[0], last, lastSlope: (last[1] - before[1]) / (last[0] - before[0]) };
  prepared.set(points, curve);
  return curve;
}
