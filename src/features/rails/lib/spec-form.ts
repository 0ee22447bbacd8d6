import { cavityResonances, planeCapacitance } from '@shared/engine/plane';
import { kneeFrequency, targetFromStep } from '@shared/engine/target';
import { formatPath } from '@shared/schemas/common.schema';
import { type RailSpec, railSpecSchema } from '@shared/schemas/rail-spec.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';
import { type Parsed, parseLength, parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';

/** The specification as it is typed: text everywhere, so that nothing typed is ever lost. */
export interface SpecForm {
  name: string;
  voltage: string;
  targetKind: 'step' | 'flat' | 'mask';
  ripple: string;
  step: string;
  impedance: string;
  mask: string;
  bandKind: 'direct' | 'derived';
  bandLow: string;
  bandHigh: string;
  rise: string;
  knee: '0.35' | '0.5';
  bandwidth: string;
  sourceKind: 'rl' | 'damped' | 'table' | 'open';
  resistance: string;
  inductance: string;
  seriesResistance: string;
  seriesInductance: string;
  inductorResistance: string;
  inductorInductance: string;
  dampingResistance: string;
  dampingInductance: string;
  sourceTable: string;
  planeKind: 'none' | 'dimensions' | 'values';
  length: string;
  width: string;
  spacing: string;
  permittivity: string;
  viaRadius: string;
  loadRadius: string;
  planeCapacitance: string;
  planeResistance: string;
  planeInductance: string;
  hasPackage: boolean;
  packageResistance: string;
  packageInductance: string;
  dieCapacitance: string;
  dieResistance: string;
  observe: 'pins' | 'die';
  hasStep: boolean;
  stepBefore: string;
  stepSize: string;
  stepRise: string;
  stepHold: string;
  stepFall: string;
}

export type SpecField = keyof SpecForm;
export type SpecErrors = Partial<Record<SpecField | 'form', string>>;

/** Which form field a path of the specification belongs to, most specific first. */
const FIELD_OF_PATH: readonly [RegExp, SpecField][] = [
  [/^name/, 'name'],
  [/^voltage_V/, 'voltage'],
  [/^target\.ripple_percent/, 'ripple'],
  [/^target\.step_A/, 'step'],
  [/^target\.impedance_ohm/, 'impedance'],
  [/^target/, 'mask'],
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

/** Reads the form: a valid specification, or what is wrong and where. */
export function readSpec(form: SpecForm): { spec: RailSpec } | { errors: SpecErrors } {
  const errors: SpecErrors = {};
  const take = (field: SpecField, parsed: Parsed): number => {
    if (parsed.ok) return parsed.value;
    errors[field] ??= parsed.reason;
    return Number.NaN;
  };
  const q = (field: SpecField, unit: UnitSymbol) => take(field, parseQuantity(String(form[field]), unit));
  const length = (field: SpecField) => take(field, parseLength(String(form[field])));
  /** Empty means zero where zero is a sensible default. */
  const orZero = (field: SpecField, unit: UnitSymbol) =>
    String(form[field]).trim() === '' ? 0 : q(field, unit);
  const spec: Record<string, unknown> = {
    name: form.name,
    voltage_V: q('voltage', 'V'),
    observe: form.hasPackage ? form.observe : 'pins',
  };
  if (form.targetKind === 'step')
    spec.target = { kind: 'step', ripple_percent: q('ripple', '%'), step_A: q('step', 'A') };
  else if (form.targetKind === 'flat') spec.target = { kind: 'flat', impedance_ohm: q('impedance', 'Ω') };
  else {
    const points = readPoints(form.mask, ['Hz', 'Ω']);
    if (!points.ok) errors.mask ??= points.reason;
    spec.target = { kind: 'mask', points: points.ok ? points.rows : [] };
  }
  if (form.bandKind === 'direct') spec.band_Hz = [q('bandLow', 'Hz'), q('bandHigh', 'Hz')];
  else {
    const rise_s = q('rise', 's');
    const regulator_bandwidth_Hz = q('bandwidth', 'Hz');
    const knee = form.knee === '0.5' ? 0.5 : 0.35;
    spec.band_basis = { rise_s, knee, regulator_bandwidth_Hz };
    spec.band_Hz = [regulator_bandwidth_Hz, rise_s > 0 ? kneeFrequency(rise_s, knee) : Number.NaN];
  }
  spec.source = readSource(form, q, orZero, errors);
  if (form.planeKind === 'dimensions') {
    const geometry = {
      length_m: length('length'),
      width_m: length('width'),
      spacing_m: length('spacing'),
      relative_permittivity: q('permittivity', ''),
      via_radius_m: length('viaRadius'),
      load_radius_m: length('loadRadius'),
    };
    const isKnown = geometry.spacing_m > 0;
    spec.plane = {
      capacitance_F: isKnown
        ? planeCapacitance(
            geometry.length_m,
            geometry.width_m,
            geometry.spacing_m,
            geometry.relative_permittivity,
          )
        : Number.NaN,
      resistance_ohm: orZero('planeResistance', 'Ω'),
      inductance_H: orZero('planeInductance', 'H'),
      geometry,
    };
  } else if (form.planeKind === 'values')
    spec.plane = {
      capacitance_F: q('planeCapacitance', 'F'),
      resistance_ohm: orZero('planeResistance', 'Ω'),
      inductance_H: orZero('planeInductance', 'H'),
    };
  if (form.hasPackage)
    spec.package = {
      resistance_ohm: orZero('packageResistance', 'Ω'),
      inductance_H: q('packageInductance', 'H'),
      die_capacitance_F: orZero('dieCapacitance', 'F'),
      die_resistance_ohm: orZero('dieResistance', 'Ω'),
    };
  if (form.hasStep)
    spec.load_step = {
      before_A: orZero('stepBefore', 'A'),
      step_A: q('stepSize', 'A'),
      rise_s: q('stepRise', 's'),
      hold_s: q('stepHold', 's'),
      fall_s: q('stepFall', 's'),
    };
  const checked = railSpecSchema.safeParse(spec);
  if (checked.success && Object.keys(errors).length === 0) return { spec: checked.data };
  // What could not be read stands in `spec` as NaN and has its own sentence already.
  const faults = (checked.error?.issues ?? [])
    .filter((issue) => issue.code !== 'invalid_type')
    .map((issue) => ({ path: formatPath(issue.path), message: issue.message }));
  const all = onShownFields({ ...errorsAtFields(faults), ...errors }, form);
  return { errors: Object.keys(all).length > 0 ? all : { form: 'something in this form is not right' } };
}

/** Moves a fault from a field that this form does not show to the one that stands for it. */
function onShownFields(errors: SpecErrors, form: SpecForm): SpecErrors {
  const { inductance, planeCapacitance: planes, bandLow, bandHigh, ...rest } = errors;
  const shown: SpecErrors = { ...rest };
  const put = (field: SpecField, message: string | undefined) => {
    if (message !== undefined) shown[field] ??= message;
  };
  put(form.sourceKind === 'damped' ? 'inductorInductance' : 'inductance', inductance);
  // A capacitance that comes out wrong comes from a dimension that has been named already.
  if (form.planeKind === 'values') put('planeCapacitance', planes);
  put(form.bandKind === 'derived' ? 'bandwidth' : 'bandLow', bandLow);
  put(form.bandKind === 'derived' ? 'rise' : 'bandHigh', bandHigh);
  return shown;
}

function readSource(
  form: SpecForm,
  q: (field: SpecField, unit: UnitSymbol) => number,
  orZero: (field: SpecField, unit: UnitSymbol) => number,
  errors: SpecErrors,
): unknown {
  switch (form.sourceKind) {
    case 'open':
      return { kind: 'open' };
    case 'rl':
      return {
        kind: 'rl',
        resistance_ohm: orZero('resistance', 'Ω'),
        inductance_H: orZero('inductance', 'H'),
      };
    case 'table': {
      const points = readPoints(form.sourceTable, ['Hz', 'Ω', 'Ω']);
      if (!points.ok) errors.sourceTable ??= points.reason;
      return { kind: 'table', points: points.ok ? points.rows : [] };
    }
    case 'damped':
      return {
        kind: 'damped',
        series_resistance_ohm: orZero('seriesResistance', 'Ω'),
        series_inductance_H: orZero('seriesInductance', 'H'),
        inductor_resistance_ohm: orZero('inductorResistance', 'Ω'),
        inductance_H: q('inductorInductance', 'H'),
        damping_ohm: q('dampingResistance', 'Ω'),
        damping_inductance_H: orZero('dampingInductance', 'H'),
      };
  }
}

/** Points, one a line, their numbers parted by blanks, tabs or semicolons: `10k 3m`. */
export function readPoints(
  text: string,
  units: readonly UnitSymbol[],
): { ok: true; rows: number[][] } | { ok: false; reason: string } {
  const rows: number[][] = [];
  const lines = text.split(/\r?\n/);
  for (let i = 0; i < lines.length; i++) {
    const line = lines[i].trim();
    if (line === '' || line.startsWith('#')) continue;
    const cells = cellsOf(line, units.length);
    if (cells.length !== units.length)
      return {
        ok: false,
        reason: `line ${i + 1}: ${units.length} numbers are wanted, ${cells.length} stand there`,
      };
    const row: number[] = [];
    for (let k = 0; k < cells.length; k++) {
      const parsed = parseQuantity(cells[k], units[k]);
      if (!parsed.ok) return { ok: false, reason: `line ${i + 1}: ${parsed.reason}` };
      row.push(parsed.value);
    }
    rows.push(row);
  }
  return rows.length === 0
    ? { ok: false, reason: `write at least one line, e.g. ${EXAMPLES.slice(0, units.length).join(' ')}` }
    : { ok: true, rows };
}

const EXAMPLES = ['10k', '3m', '5m'];

/** The numbers of a line: parted by blanks, tabs or semicolons, or, where that does not give enough, by commas. */
function cellsOf(line: string, wanted: number): string[] {
  const cells = line
    .split(/[;\t ]+/)
    .map((cell) => cell.replace(/,$/, ''))
    .filter(Boolean);
  if (cells.length === wanted) return cells;
  const byComma = line.split(/\s*[,;]\s*/).filter(Boolean);
  return byComma.length === wanted ? byComma : cells;
}

/** What the target comes to while one types: `3 % of 0.9 V at 9 A → 3.00 mΩ`. Empty until it can be said. */
export function targetSentence(form: SpecForm): string {
  const v = parseQuantity(form.voltage, 'V');
  const ripple = parseQuantity(form.ripple, '%');
  const step = parseQuantity(form.step, 'A');
  if (form.targetKind !== 'step' || !v.ok || !ripple.ok || !step.ok || step.value <= 0) return '';
  const z = targetFromStep(v.value, ripple.value, step.value);
  const trim = { trim: true };
  return `${formatQuantity(ripple.value, '%', trim)} of ${formatVolts(v.value)} at ${formatQuantity(step.value, 'A', trim)} → ${formatQuantity(z, 'Ω')}`;
}

/** What the band comes to: `50 kHz – 35 MHz`. */
export function bandSentence(form: SpecForm): string {
  const rise = parseQuantity(form.rise, 's');
  const low = parseQuantity(form.bandwidth, 'Hz');
  if (form.bandKind !== 'derived' || !rise.ok || !low.ok || rise.value <= 0) return '';
  const high = kneeFrequency(rise.value, form.knee === '0.5' ? 0.5 : 0.35);
  return `${form.knee} ÷ ${formatQuantity(rise.value, 's', { trim: true })} → band ${formatQuantity(low.value, 'Hz', { trim: true })} to ${formatQuantity(high, 'Hz')}`;
}

/** What the planes come to: capacitance and first cavity resonances. */
export function planeSentence(form: SpecForm): string {
  const [a, b, h] = [form.length, form.width, form.spacing].map(parseLength);
  const er = parseQuantity(form.permittivity, '');
  if (form.planeKind !== 'dimensions' || !a.ok || !b.ok || !h.ok || !er.ok) return '';
  if (!(a.value > 0 && b.value > 0 && h.value > 0 && er.value >= 1)) return '';
  const c = planeCapacitance(a.value, b.value, h.value, er.value);
  const [fa, fb] = cavityResonances(a.value, b.value, er.value);
  return `${formatQuantity(c, 'F')}; first cavity resonances ${formatQuantity(fa, 'Hz')} and ${formatQuantity(fb, 'Hz')}`;
}
