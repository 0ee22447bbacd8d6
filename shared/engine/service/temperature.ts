import { EngineError } from '../errors';
import { type Band, steady } from './band';
import { BASIS } from './basis';
import { finite } from './checks';
import type { Dielectric } from './dielectric';
import { factorCurve } from './factor-curve';
import { familyOf } from './family';
import type { CurvePoints, PartBehaviour } from './part-behaviour';
import { usualDrift } from './temperature-drift';

const ABSOLUTE_ZERO_C = -273.15;

/**
 * What a temperature in °C makes of a part's capacitance, as C ÷ C(reference). The part's curve gives a value (held at its ends);
 * a class 1 code a value with a narrow band; a class 2 or 3 code only a band round 1, since any curve inside its limits is
 * allowed; other technologies a usual drift. A bare part is taken as it stands. Throws EngineError('temperature_C') for what is
 * no temperature.
 */
export function temperatureFactor(part: PartBehaviour, temperature_C: number): Band {
  if (finite('temperature_C', temperature_C) < ABSOLUTE_ZERO_C)
    throw new EngineError('temperature_C', 'is below absolute zero');
  if (part.temperature_curve) return fromCurve(part.temperature_curve, temperature_C);
  const family = familyOf(part);
  if (family.kind === 'bare') return steady(1, false, BASIS.asGiven);
  if (family.kind !== 'ceramic') return usualDrift(family.kind, temperature_C);
  return family.dielectric ? fromCode(family.dielectric, temperature_C) : unknownCeramic(temperature_C);
}

function fromCurve(points: CurvePoints, temperature_C: number): Band {
  const { at, first, last } = factorCurve(points, 'temperature_curve');
  const isOutside = temperature_C < first[0] || temperature_C > last[0];
  return steady(
    at(temperature_C),
    isOutside,
    isOutside ? BASIS.beyondTemperatureCurve : BASIS.temperatureCurve,
  );
}

function fromCode(dielectric: Dielectric, temperature_C: number): Band {
  const { code, low_C, high_C, reference_C } = dielectric;
  if (temperature_C === reference_C) return steady(1, false, BASIS.atReference);
  const isOutside = temperature_C < low_C || temperature_C > high_C;
  const basis = isOutside ? BASIS.outsideLimits(code, low_C, high_C) : BASIS.limits(code);
  if (dielectric.class !== 1) {
    const { lowest, highest } = dielectric;
    return { factor: 1, low: 1 + lowest, high: 1 + highest, estimated: true, basis };
  }
  const rise_K = temperature_C - reference_C;
  const factor = 1 + dielectric.slope_ppmPerK * rise_K * 1e-6;
  const spread = dielectric.tolerance_ppmPerK * Math.abs(rise_K) * 1e-6;
  return { factor, low: factor - spread, high: factor + spread, estimated: isOutside, basis };
}

function unknownCeramic(temperature_C: number): Band {
  if (temperature_C === 25) return steady(1, false, BASIS.atReference);
  return { factor: 1, low: 0.85, high: 1.15, estimated: true, basis: BASIS.unknownLimits };
}
