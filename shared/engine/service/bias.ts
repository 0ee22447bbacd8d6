import { EngineError } from '../errors';
import { BASIS } from './basis';
import { estimatedBias } from './bias-estimate';
import { notNegative } from './checks';
import { factorCurve } from './factor-curve';
import { familyOf } from './family';
import type { CurvePoints, Estimate, PartBehaviour } from './part-behaviour';

/** Beyond a bias curve's last point no less than this is taken to be left (or the last point, if that is lower still). */
export const LEAST_EXTENDED_FACTOR = 0.05;

/**
 * What a DC voltage leaves of a part's capacitance: C(V) ÷ C(0 V), volts as on the rail. By the part's curve where there is one;
 * else 1 for what does not lose, and for class 2 ceramics an estimate by V ÷ V rated and case. A bare part is taken as it
 * stands. Throws EngineError for a negative voltage ('voltage_V') and for one above the rating ('rated_voltage_V').
 */
export function biasFactor(part: PartBehaviour, voltage_V: number): Estimate {
  notNegative('voltage_V', voltage_V);
  const rated = part.rated_voltage_V;
  if (rated !== undefined && !(notNegative('rated_voltage_V', rated) > 0))
    throw new EngineError('rated_voltage_V', 'must be above zero');
  // A hair above (3.3 against 3.3000000001 from a table) is the rating itself.
  if (rated !== undefined && voltage_V > rated * (1 + 1e-9))
    throw new EngineError('rated_voltage_V', `${voltage_V} V is above its rating of ${rated} V`);
  if (part.bias_curve) return fromCurve(part.bias_curve, voltage_V);
  const family = familyOf(part);
  if (family.kind === 'bare') return { factor: 1, estimated: false, basis: BASIS.asGiven };
  if (family.kind !== 'ceramic')
    return { factor: 1, estimated: false, basis: BASIS.doesNotLose(family.kind) };
  const { dielectric } = family;
  if (dielectric?.class === 1)
    return { factor: 1, estimated: false, basis: BASIS.doesNotLose(dielectric.code) };
  if (voltage_V === 0) return { factor: 1, estimated: false, basis: BASIS.noBias };
  if (rated === undefined) return { factor: 1, estimated: true, basis: BASIS.noRating };
  return estimatedBias(voltage_V / rated, part.case, dielectric);
}

function fromCurve(points: CurvePoints, voltage_V: number): Estimate {
  const { at, first, last, lastSlope } = factorCurve(points, 'bias_curve');
  if (voltage_V <= last[0])
    return { factor: at(voltage_V), estimated: voltage_V < first[0], basis: BASIS.biasCurve };
  // Level would be too kind: the fall goes on as at the end, though never up again.
  const extended = last[1] + Math.min(0, lastSlope) * (voltage_V - last[0]);
  const factor = Math.max(extended, Math.min(last[1], LEAST_EXTENDED_FACTOR));
  return { factor, estimated: true, basis: BASIS.beyondBiasCurve };
}
