import { kneeFrequency } from '@shared/engine/target';
import type { BandBasis, RailSpec, Target } from '@shared/schemas/rail-spec.schema';
import { readBudget, rippleFromBudget_percent } from './read-budget';
import type { SpecReader } from './spec-reader';

/** The target, and the budget that goes with it. */
export function readTarget(reader: SpecReader, voltage_V: number): Pick<RailSpec, 'target' | 'noise_budget'> {
  const { form } = reader;
  const budget = readBudget(reader);
  const left_percent = budget && rippleFromBudget_percent(reader, budget, voltage_V);
  const given = budget && { noise_budget: budget };
  switch (form.targetKind) {
    case 'step': {
      const ripple_percent = left_percent ?? reader.quantity('ripple', '%');
      const step_A = reader.quantity('step', 'A');
      return { target: { kind: 'step', ripple_percent, step_A, ...readRise(reader) }, ...given };
    }
    case 'flat': {
      const impedance_ohm = reader.quantity('impedance', 'Ω');
      return { target: { kind: 'flat', impedance_ohm, ...readRise(reader) }, ...given };
    }
    case 'mask': {
      const points = reader.points('mask', ['Hz', 'Ω']).map(([f, z]): [number, number] => [f, z]);
      return { target: { kind: 'mask', points }, ...given };
    }
  }
}

function readRise(reader: SpecReader): Pick<Exclude<Target, { kind: 'mask' }>, 'rise_s' | 'rising_H'> {
  switch (reader.form.riseKind) {
    case 'level':
      return {};
    case 'time':
      return { rise_s: reader.quantity('targetRise', 's') };
    case 'inductance':
      return { rising_H: reader.quantity('targetInductance', 'H') };
  }
}

export function readBand(reader: SpecReader): Pick<RailSpec, 'band_Hz' | 'band_basis'> {
  const { form } = reader;
  if (form.bandKind === 'direct')
    return { band_Hz: [reader.quantity('bandLow', 'Hz'), reader.quantity('bandHigh', 'Hz')] };
  const knee = form.knee === '0.5' ? 0.5 : 0.35;
  const band_basis: BandBasis = {
    rise_s: reader.quantity('rise', 's'),
    knee,
    regulator_bandwidth_Hz: reader.quantity('bandwidth', 'Hz'),
  };
  const { rise_s, regulator_bandwidth_Hz } = band_basis;
  return {
    band_basis,
    band_Hz: [regulator_bandwidth_Hz, rise_s > 0 ? kneeFrequency(rise_s, knee) : Number.NaN],
  };
}
