import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatInput } from '@shared/units/format';
import { pointsInput } from './points-input';
import type { SpecForm } from './spec-form';

type Fields = Partial<SpecForm>;

export function targetFields({ target }: RailSpec): Fields {
  if (target.kind === 'mask') return { targetKind: 'mask', mask: pointsInput(target.points) };
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

export function budgetFields({ noise_budget: budget }: RailSpec): Fields {
  if (!budget) return {};
  return {
    budgetKind: 'budget',
    tolerance: String(budget.tolerance_percent),
    setpoint: String(budget.setpoint_percent),
    dcDrop: formatInput(budget.dc_drop_V),
    regulatorRipple: formatInput(budget.regulator_ripple_V),
  };
}

export function bandFields({ band_Hz, band_basis: basis }: RailSpec): Fields {
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
