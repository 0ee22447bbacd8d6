import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { SpecReader } from './spec-reader';

export function readPackage(reader: SpecReader): RailSpec['package'] {
  if (!reader.form.hasPackage) return undefined;
  return {
    resistance_ohm: reader.quantityOrZero('packageResistance', 'Ω'),
    inductance_H: reader.quantity('packageInductance', 'H'),
    die_capacitance_F: reader.quantityOrZero('dieCapacitance', 'F'),
    die_resistance_ohm: reader.quantityOrZero('dieResistance', 'Ω'),
  };
}

export function readLoadStep(reader: SpecReader): RailSpec['load_step'] {
  const { hasStep, stepEnd } = reader.form;
  if (!hasStep) return undefined;
  return {
    before_A: reader.quantityOrZero('stepBefore', 'A'),
    step_A: reader.quantity('stepSize', 'A'),
    rise_s: reader.quantity('stepRise', 's'),
    hold_s: reader.quantity('stepHold', 's'),
    fall_s: reader.quantity('stepFall', 's'),
    ...(stepEnd !== '' && { end_s: reader.quantity('stepEnd', 's') }),
  };
}

export function readStartUp(reader: SpecReader): RailSpec['start_up'] {
  if (!reader.form.hasStartUp) return undefined;
  return {
    soft_start_s: reader.quantity('softStart', 's'),
    current_limit_A: reader.quantity('currentLimit', 'A'),
  };
}
