import type { RailSpec, Source } from '@shared/schemas/rail-spec.schema';
import { formatInput } from '@shared/units/format';
import { ageInput } from './age-text';
import { millimetres } from './millimetres';
import type { SpecForm } from './spec-form';
import { EMPTY_SPEC } from './spec-form-values';

type Fields = Partial<SpecForm>;

/** The form that reads back as `spec`. */
export function formOf(spec: RailSpec): SpecForm {
  return {
    ...EMPTY_SPEC,
    name: spec.name,
    voltage: String(spec.voltage_V),
    ...targetFields(spec),
    ...budgetFields(spec),
    ...bandFields(spec),
    ...sourceFields(spec.source),
    ...planeFields(spec),
    observe: spec.observe,
    ...packageFields(spec),
    ...stepFields(spec),
    ...startUpFields(spec),
    ...conditionsFields(spec),
  };
}

const pointsText = (points: readonly (readonly number[])[]) =>
  points.map((row) => row.map(formatInput).join(' ')).join('\n');

function targetFields({ target }: RailSpec): Fields {
  if (target.kind === 'mask') return { targetKind: 'mask', mask: pointsText(target.points) };
  const rise: Fields =
    target.rise_s !== undefined
      ? { riseKind: 'time', targetRise: formatInput(target.rise_s) }
      : target.rising_H !== undefined
        ? { riseKind: 'inductance', targetInductance: formatInput(target.rising_H) }
        : {};
  if (target.kind === 'flat')
    return { targetKind: 'flat', impedance: formatInput(target.impedance_ohm), ...rise };
  return {
    targetKind: 'step',
    ripple: String(target.ripple_percent),
    step: formatInput(target.step_A),
    ...rise,
  };
}

function budgetFields({ noise_budget: budget }: RailSpec): Fields {
  if (!budget) return {};
  return {
    budgetKind: 'budget',
    tolerance: String(budget.tolerance_percent),
    setpoint: String(budget.setpoint_percent),
    dcDrop: formatInput(budget.dc_drop_V),
    regulatorRipple: formatInput(budget.regulator_ripple_V),
  };
}

function bandFields({ band_Hz, band_basis: basis }: RailSpec): Fields {
  return {
    bandLow: formatInput(band_Hz[0]),
    bandHigh: formatInput(band_Hz[1]),
    ...(basis && {
      bandKind: 'derived',
      rise: formatInput(basis.rise_s),
      knee: basis.knee === 0.5 ? '0.5' : '0.35',
      bandwidth: formatInput(basis.regulator_bandwidth_Hz),
    }),
  };
}

function sourceFields(source: Source): Fields {
  switch (source.kind) {
    case 'open':
      return { sourceKind: 'open' };
    case 'table':
      return { sourceKind: 'table', sourceTable: pointsText(source.points) };
    case 'rl':
      return {
        sourceKind: 'rl',
        resistance: formatInput(source.resistance_ohm),
        inductance: formatInput(source.inductance_H),
      };
    case 'damped':
      return {
        sourceKind: 'damped',
        seriesResistance: formatInput(source.series_resistance_ohm),
        seriesInductance: formatInput(source.series_inductance_H),
        inductorResistance: formatInput(source.inductor_resistance_ohm),
        inductorInductance: formatInput(source.inductance_H),
        dampingResistance: formatInput(source.damping_ohm),
        dampingInductance: formatInput(source.damping_inductance_H),
      };
  }
}

function planeFields({ plane }: RailSpec): Fields {
  if (!plane) return { planeKind: 'none' };
  const { geometry } = plane;
  return {
    planeKind: geometry ? (geometry.pair ? 'stackup' : 'dimensions') : 'values',
    planeCapacitance: formatInput(plane.capacitance_F),
    planeResistance: formatInput(plane.resistance_ohm),
    planeInductance: formatInput(plane.inductance_H),
    ...(geometry && {
      length: millimetres(geometry.length_m),
      width: millimetres(geometry.width_m),
      spacing: millimetres(geometry.spacing_m),
      permittivity: String(geometry.relative_permittivity),
      viaRadius: millimetres(geometry.via_radius_m),
      loadRadius: millimetres(geometry.load_radius_m),
    }),
    ...(geometry?.pair && { pairUpper: geometry.pair[0], pairLower: geometry.pair[1] }),
  };
}

function packageFields({ package: pack }: RailSpec): Fields {
  if (!pack) return {};
  return {
    hasPackage: true,
    packageResistance: formatInput(pack.resistance_ohm),
    packageInductance: formatInput(pack.inductance_H),
    dieCapacitance: formatInput(pack.die_capacitance_F),
    dieResistance: formatInput(pack.die_resistance_ohm),
  };
}

function stepFields({ load_step: step }: RailSpec): Fields {
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

function startUpFields({ start_up: start }: RailSpec): Fields {
  if (!start) return {};
  return {
    hasStartUp: true,
    softStart: formatInput(start.soft_start_s),
    currentLimit: formatInput(start.current_limit_A),
  };
}

function conditionsFields({ conditions }: RailSpec): Fields {
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
