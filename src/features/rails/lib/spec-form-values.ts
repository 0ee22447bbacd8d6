import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatInput } from '@shared/units/format';
import type { SpecForm } from './spec-form';

const millimetres = (metres: number) => String(Number((metres * 1000).toPrecision(12)));

/** An empty form with the usual defaults. */
export const EMPTY_SPEC: SpecForm = {
  name: '',
  voltage: '',
  targetKind: 'step',
  ripple: '3',
  step: '',
  impedance: '',
  mask: '',
  bandKind: 'direct',
  bandLow: '10k',
  bandHigh: '30M',
  rise: '10n',
  knee: '0.35',
  bandwidth: '50k',
  sourceKind: 'rl',
  resistance: '1m',
  inductance: '20n',
  seriesResistance: '',
  seriesInductance: '',
  inductorResistance: '',
  inductorInductance: '',
  dampingResistance: '',
  dampingInductance: '',
  sourceTable: '',
  planeKind: 'dimensions',
  length: '100',
  width: '60',
  spacing: '0.1',
  permittivity: '4.2',
  viaRadius: '0.15',
  loadRadius: '1.5',
  planeCapacitance: '',
  planeResistance: '1m',
  planeInductance: '10p',
  hasPackage: false,
  packageResistance: '',
  packageInductance: '',
  dieCapacitance: '',
  dieResistance: '',
  observe: 'pins',
  hasStep: false,
  stepBefore: '',
  stepSize: '',
  stepRise: '10n',
  stepHold: '50u',
  stepFall: '10n',
};

/** The form that reads back as `spec`. */
export function formOf(spec: RailSpec): SpecForm {
  const form: SpecForm = {
    ...EMPTY_SPEC,
    name: spec.name,
    voltage: formatInput(spec.voltage_V),
    observe: spec.observe,
  };
  const { target, source, plane, band_basis: basis, load_step: step } = spec;
  form.targetKind = target.kind;
  if (target.kind === 'step') {
    form.ripple = formatInput(target.ripple_percent).replace(/m$/, 'e-3');
    form.step = formatInput(target.step_A);
  } else if (target.kind === 'flat') form.impedance = formatInput(target.impedance_ohm);
  else form.mask = target.points.map((row) => row.map(formatInput).join(' ')).join('\n');
  form.bandLow = formatInput(spec.band_Hz[0]);
  form.bandHigh = formatInput(spec.band_Hz[1]);
  if (basis) {
    form.bandKind = 'derived';
    form.rise = formatInput(basis.rise_s);
    form.knee = basis.knee === 0.5 ? '0.5' : '0.35';
    form.bandwidth = formatInput(basis.regulator_bandwidth_Hz);
  }
  form.sourceKind = source.kind;
  if (source.kind === 'rl') {
    form.resistance = formatInput(source.resistance_ohm);
    form.inductance = formatInput(source.inductance_H);
  } else if (source.kind === 'damped') {
    form.seriesResistance = formatInput(source.series_resistance_ohm);
    form.seriesInductance = formatInput(source.series_inductance_H);
    form.inductorResistance = formatInput(source.inductor_resistance_ohm);
    form.inductorInductance = formatInput(source.inductance_H);
    form.dampingResistance = formatInput(source.damping_ohm);
    form.dampingInductance = formatInput(source.damping_inductance_H);
  } else if (source.kind === 'table') {
    form.sourceTable = source.points.map((row) => row.map(formatInput).join(' ')).join('\n');
  }
  form.planeKind = plane ? (plane.geometry ? 'dimensions' : 'values') : 'none';
  if (plane) {
    form.planeCapacitance = formatInput(plane.capacitance_F);
    form.planeResistance = formatInput(plane.resistance_ohm);
    form.planeInductance = formatInput(plane.inductance_H);
    if (plane.geometry) {
      form.length = millimetres(plane.geometry.length_m);
      form.width = millimetres(plane.geometry.width_m);
      form.spacing = millimetres(plane.geometry.spacing_m);
      form.permittivity = String(plane.geometry.relative_permittivity);
      form.viaRadius = millimetres(plane.geometry.via_radius_m);
      form.loadRadius = millimetres(plane.geometry.load_radius_m);
    }
  }
  if (spec.package) {
    form.hasPackage = true;
    form.packageResistance = formatInput(spec.package.resistance_ohm);
    form.packageInductance = formatInput(spec.package.inductance_H);
    form.dieCapacitance = formatInput(spec.package.die_capacitance_F);
    form.dieResistance = formatInput(spec.package.die_resistance_ohm);
  }
  if (step) {
    form.hasStep = true;
    form.stepBefore = formatInput(step.before_A);
    form.stepSize = formatInput(step.step_A);
    form.stepRise = formatInput(step.rise_s);
    form.stepHold = formatInput(step.hold_s);
    form.stepFall = formatInput(step.fall_s);
  }
  return form;
}
