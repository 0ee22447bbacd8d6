import type { SpecErrors, SpecField, SpecForm } from './spec-form';

/** Which form field a path of the specification belongs to, most specific first. */
const FIELD_OF_PATH: readonly [RegExp, SpecField][] = [
  [/^name/, 'name'],
  [/^voltage_V/, 'voltage'],
  [/^target\.ripple_percent/, 'ripple'],
  [/^target\.step_A/, 'step'],
  [/^target\.impedance_ohm/, 'impedance'],
  [/^target\.rise_s/, 'targetRise'],
  [/^target\.rising_H/, 'targetInductance'],
  [/^target/, 'mask'],
  [/^noise_budget\.setpoint/, 'setpoint'],
  [/^noise_budget\.dc_drop/, 'dcDrop'],
  [/^noise_budget\.regulator/, 'regulatorRipple'],
  [/^noise_budget/, 'tolerance'],
  [/^band_Hz\[0\]/, 'bandLow'],
  [/^band_Hz/, 'bandHigh'],
  [/^band_basis\.rise_s/, 'rise'],
  [/^band_basis/, 'bandwidth'],
  [/^source\.points/, 'sourceTable'],
  [/^source\.resistance_ohm/, 'resistance'],
  [/^source\.series_resistance_ohm/, 'seriesResistance'],
  [/^source\.series_inductance_H/, 'seriesInductance'],
  [/^source\.inductor_resistance_ohm/, 'inductorResistance'],
  [/^source\.damping_ohm/, 'dampingResistance'],
  [/^source\.damping_inductance_H/, 'dampingInductance'],
  [/^source\.inductance_H/, 'inductance'],
  [/^plane\.geometry\.pair/, 'pairUpper'],
  [/^plane\.geometry\.length_m/, 'length'],
  [/^plane\.geometry\.width_m/, 'width'],
  [/^plane\.geometry\.spacing_m/, 'spacing'],
  [/^plane\.geometry\.relative/, 'permittivity'],
  [/^plane\.geometry\.via/, 'viaRadius'],
  [/^plane\.geometry\.load/, 'loadRadius'],
  [/^plane\.capacitance_F/, 'planeCapacitance'],
  [/^plane\.resistance_ohm/, 'planeResistance'],
  [/^plane\.inductance_H/, 'planeInductance'],
  [/^package\.resistance_ohm/, 'packageResistance'],
  [/^package\.inductance_H/, 'packageInductance'],
  [/^package\.die_c/, 'dieCapacitance'],
  [/^package\.die_r/, 'dieResistance'],
  [/^package/, 'packageInductance'],
  [/^load_step\.before_A/, 'stepBefore'],
  [/^load_step\.step_A/, 'stepSize'],
  [/^load_step\.rise_s/, 'stepRise'],
  [/^load_step\.hold_s/, 'stepHold'],
  [/^load_step/, 'stepFall'],
  [/^start_up\.soft_start_s/, 'softStart'],
  [/^start_up/, 'currentLimit'],
  [/^conditions\.coldest_C/, 'coldest'],
  [/^conditions\.usual_C/, 'usual'],
  [/^conditions\.hottest_C/, 'hottest'],
  [/^conditions\.age_h/, 'age'],
  [/^conditions/, 'vary'],
];

/** Puts faults found by the schema (here or on the server) at the fields they belong to. */
export function errorsAtFields(faults: readonly { path: string; message: string }[]): SpecErrors {
  const errors: SpecErrors = {};
  for (const { path, message } of faults) {
    const field = FIELD_OF_PATH.find(([pattern]) => pattern.test(path))?.[1] ?? 'form';
    errors[field] ??= message;
  }
  return errors;
}

/** Moves a fault from a field that this form does not show to the one that stands for it. */
export function onShownFields(errors: SpecErrors, form: SpecForm): SpecErrors {
  const { inductance, planeCapacitance: planes, bandLow, bandHigh, ripple, ...others } = errors;
  const { spacing, permittivity, ...rest } = others;
  const shown: SpecErrors = { ...rest };
  const put = (field: SpecField, message: string | undefined) => {
    if (message !== undefined) shown[field] ??= message;
  };
  put(form.sourceKind === 'damped' ? 'inductorInductance' : 'inductance', inductance);
  // A capacitance that comes out wrong comes from a dimension that has been named already.
  if (form.planeKind === 'values') put('planeCapacitance', planes);
  put(form.planeKind === 'stackup' ? 'pairUpper' : 'spacing', spacing);
  put(form.planeKind === 'stackup' ? 'pairUpper' : 'permittivity', permittivity);
  put(form.bandKind === 'derived' ? 'bandwidth' : 'bandLow', bandLow);
  put(form.bandKind === 'derived' ? 'rise' : 'bandHigh', bandHigh);
  put(form.budgetKind === 'budget' ? 'tolerance' : 'ripple', ripple);
  return shown;
}
