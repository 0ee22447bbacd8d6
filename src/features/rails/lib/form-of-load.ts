import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatInput } from '@shared/units/format';
import { ageInput } from './age-text';
import type { SpecForm } from './spec-form';

type Fields = Partial<SpecForm>;

export function packageFields({ package: pack }: RailSpec): Fields {
  if (!pack) return {};
  return {
    hasPackage: true,
    packageResistance: formatInput(pack.resistance_ohm),
    packageInductance: formatInput(pack.inductance_H),
    dieCapacitance: formatInput(pack.die_capacitance_F),
    dieResistance: formatInput(pack.die_resistance_ohm),
  };
}

export function stepFields({ load_step: step }: RailSpec): Fields {
  if (!step) return {};
  return {
    hasStep: true,
    stepBefore: formatInput(step.before_A),
    stepSize: formatInput(step.step_A),
    stepRise: formatInput(step.rise_s),
    stepHold: formatInput(step.hold_s),
    stepFall: formatInput(step.fall_s),
    stepEnd: step.end_s === undefined ? '' : formatInput(step.end_s),
  };
}

export function startUpFields({ start_up: start }: RailSpec): Fields {
  if (!start) return {};
  return {
    hasStartUp: true,
    softStart: formatInput(start.soft_start_s),
    currentLimit: formatInput(start.current_limit_A),
  };
}

export function conditionsFields({ conditions }: RailSpec): Fields {
  if (!conditions) return { conditionsKind: 'assumed' };
  return {
    conditionsKind: 'stated',
    coldest: String(conditions.coldest_C),
    usual: String(conditions.usual_C),
    hottest: String(conditions.hottest_C),
    age: ageInput(conditions.age_h),
    vary: conditions.vary,
  };
}
