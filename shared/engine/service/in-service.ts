import { EngineError } from '../errors';
import { ageingEstimate } from './ageing';
import { BASIS } from './basis';
import { biasFactor } from './bias';
import { notNegative } from './checks';
import { familyOf } from './family';
import { type End, parasiticFactor, USUAL_ESL_PERCENT, USUAL_ESR_PERCENT } from './parasitics';
import type { Estimate, PartBehaviour } from './part-behaviour';
import { temperatureFactor } from './temperature';
import { toleranceFactors } from './tolerance';

/** Where a part is looked at: DC volts across it, °C, hours since it was soldered, and which end of each tolerance. */
export interface ServiceState {
  voltage_V: number;
  temperature_C: number;
  age_h: number;
  capacitance: End;
  esr: End;
  esl: End;
}

export interface ServiceFactor extends Estimate {
  kind: 'bias' | 'temperature' | 'ageing' | 'tolerance';
}

export interface ServiceValues {
  capacitance_F: number;
  esr_ohm: number;
  esl_H: number;
  /** Value in service ÷ catalogue value. */
  capacitance_factor: number;
  esr_factor: number;
  esl_factor: number;
  /** What makes the capacitance's factor: bias, temperature, ageing, tolerance, in this order. */
  factors: ServiceFactor[];
  /** True when any of the three values rests on an estimate. */
  estimated: boolean;
}

/**
 * A part's values in service: C = C_catalogue · k_bias · k_temperature · k_ageing · k_tolerance, ESR and ESL by their own
 * tolerances. The low and high ends of the capacitance take the ends of the tolerance and of the temperature's band together.
 * Throws EngineError naming the field: negative, missing or infinite numbers, voltage above the rating, a letter that does not
 * go with the value, and a capacitance of which nothing is left ('capacitance_F').
 */
export function inService(part: PartBehaviour, state: ServiceState): ServiceValues {
  if (!(notNegative('capacitance_F', part.capacitance_F) > 0))
    throw new EngineError('capacitance_F', 'must be above zero');
  notNegative('esr_ohm', part.esr_ohm);
  notNegative('esl_H', part.esl_H);
  const { factor, low, high, estimated, basis } = temperatureFactor(part, state.temperature_C);
  const temperature = { low, nominal: factor, high }[state.capacitance];
  const factors: ServiceFactor[] = [
    { kind: 'bias', ...biasFactor(part, state.voltage_V) },
    { kind: 'temperature', factor: temperature, estimated, basis },
    { kind: 'ageing', ...ageingEstimate(part, state.age_h) },
    { kind: 'tolerance', ...toleranceAt(part, state.capacitance) },
  ];
  const capacitance_factor = factors.reduce((product, one) => product * one.factor, 1);
  const capacitance_F = part.capacitance_F * capacitance_factor;
  if (!(capacitance_F > 0) || !Number.isFinite(capacitance_F))
    throw new EngineError('capacitance_F', 'nothing of it is left in service');
  const isBare = familyOf(part).kind === 'bare';
  const esr = parasiticFactor('esr_tolerance_percent', part.esr_tolerance_percent, state.esr, {
    usual: isBare ? 0 : USUAL_ESR_PERCENT,
  });
  const esl = parasiticFactor('esl_tolerance_percent', part.esl_tolerance_percent, state.esl, {
    usual: isBare ? 0 : USUAL_ESL_PERCENT,
  });
  return {
    capacitance_F,
    esr_ohm: part.esr_ohm * esr.factor,
    esl_H: part.esl_H * esl.factor,
    capacitance_factor,
    esr_factor: esr.factor,
    esl_factor: esl.factor,
    factors,
    estimated: esr.estimated || esl.estimated || factors.some((one) => one.estimated),
  };
}

/** Without a letter nothing is known; for anything but a bare part that makes its ends an estimate. */
function toleranceAt(part: PartBehaviour, end: End): Estimate {
  if (part.tolerance === undefined) {
    const estimated = end !== 'nominal' && familyOf(part).kind !== 'bare';
    return { factor: 1, estimated, basis: BASIS.noTolerance };
  }
  const { low, high } = toleranceFactors(part.tolerance, part.capacitance_F);
  const letter = part.tolerance.trim().toUpperCase();
  return { factor: { low, nominal: 1, high }[end], estimated: false, basis: BASIS.letter(letter, end) };
}
