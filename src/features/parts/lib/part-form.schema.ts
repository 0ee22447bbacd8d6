import { type Part, partFieldsSchema, TOLERANCE_MISFIT, toleranceFits } from '@shared/schemas/part.schema';
import { formatInput } from '@shared/units/format';
import { type Parsed, parseLength, parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';
import { z } from 'zod';
import { curveShape, curveText } from './curve-fields';

const { shape } = partFieldsSchema;

/** The quantities of the form, each with the unit that is understood in its field. */
export const QUANTITIES = {
  capacitance_F: 'F',
  rated_voltage_V: 'V',
  esr_ohm: 'Ω',
  esl_H: 'H',
  mount_H: 'H',
  height_mm: 'mm',
  unit_cost: '',
  area_mm2: 'mm²',
  ageing_percent_per_decade: '%',
  esr_tolerance_percent: '%',
  esl_tolerance_percent: '%',
} as const satisfies Record<string, UnitSymbol>;
export type QuantityName = keyof typeof QUANTITIES;

/** Reads a field in the unit that the part keeps: millimetres for its height, base units for the rest. */
export function readField(text: string, unit: UnitSymbol): Parsed {
  if (unit !== 'mm') return parseQuantity(text, unit);
  const length = parseLength(text);
  return length.ok ? { ok: true, value: Number((length.value * 1000).toPrecision(12)) } : length;
}

const required = <T extends z.ZodType<number, number>>(unit: UnitSymbol, range: T) =>
  z
    .string()
    .transform((text, ctx): number => {
      const parsed = readField(text, unit);
      if (parsed.ok) return parsed.value;
      ctx.addIssue({ code: 'custom', message: parsed.reason });
      return z.NEVER;
    })
    .pipe(range);

const optional = <T extends z.ZodType<number | null, number | null>>(unit: UnitSymbol, range: T) =>
  z
    .string()
    .transform((text, ctx): number | null => {
      if (text.trim() === '') return null;
      const parsed = readField(text, unit);
      if (parsed.ok) return parsed.value;
      ctx.addIssue({ code: 'custom', message: parsed.reason });
      return z.NEVER;
    })
    .pipe(range);

/** What stands in the form, all of it text as typed → the fields of a part. */
export const partFormSchema = z
  .object({
    ...shape,
    description: shape.description.unwrap(),
    dielectric: shape.dielectric.unwrap(),
    termination: shape.termination.unwrap(),
    capacitance_F: required('F', shape.capacitance_F),
    rated_voltage_V: required('V', shape.rated_voltage_V),
    esr_ohm: required('Ω', shape.esr_ohm),
    esl_H: required('H', shape.esl_H),
    mount_H: required('H', shape.mount_H),
    height_mm: optional('mm', shape.height_mm.unwrap()),
    unit_cost: optional('', shape.unit_cost.unwrap()),
    area_mm2: optional('mm²', shape.area_mm2.unwrap()),
    ageing_percent_per_decade: optional('%', shape.ageing_percent_per_decade.unwrap()),
    esr_tolerance_percent: optional('%', shape.esr_tolerance_percent.unwrap()),
    esl_tolerance_percent: optional('%', shape.esl_tolerance_percent.unwrap()),
    ...curveShape,
  })
  .refine(toleranceFits, { path: ['tolerance'], message: TOLERANCE_MISFIT });
export type PartFormInput = z.input<typeof partFormSchema>;
export type PartFormOutput = z.output<typeof partFormSchema>;

export const EMPTY_PART: PartFormInput = {
  partNumber: '',
  description: '',
  technology: 'ceramic',
  dielectric: '',
  caseSize: '',
  capacitance_F: '',
  tolerance: 'K',
  rated_voltage_V: '',
  esr_ohm: '',
  esl_H: '',
  mount_H: '',
  height_mm: '',
  termination: 'standard',
  unit_cost: '',
  area_mm2: '',
  ageing_percent_per_decade: '',
  esr_tolerance_percent: '',
  esl_tolerance_percent: '',
  bias_curve: '',
  temperature_curve: '',
  esr_table: '',
  impedance_table: '',
};

const plain = (value: number | null) => (value === null ? '' : String(value));

/** A part as it stands in the form, so that saving it untouched changes nothing. */
export const partFormInput = (part: Part): PartFormInput => ({
  partNumber: part.partNumber,
  description: part.description,
  technology: part.technology,
  dielectric: part.dielectric,
  caseSize: part.caseSize,
  capacitance_F: formatInput(part.capacitance_F),
  tolerance: part.tolerance,
  rated_voltage_V: formatInput(part.rated_voltage_V),
  esr_ohm: formatInput(part.esr_ohm),
  esl_H: formatInput(part.esl_H),
  mount_H: formatInput(part.mount_H),
  height_mm: plain(part.height_mm),
  termination: part.termination,
  unit_cost: plain(part.unit_cost),
  area_mm2: plain(part.area_mm2),
  ageing_percent_per_decade: plain(part.ageing_percent_per_decade),
  esr_tolerance_percent: plain(part.esr_tolerance_percent),
  esl_tolerance_percent: plain(part.esl_tolerance_percent),
  bias_curve: curveText('bias_curve', part.bias_curve),
  temperature_curve: curveText('temperature_curve', part.temperature_curve),
  esr_table: curveText('esr_table', part.esr_table),
  impedance_table: curveText('impedance_table', part.impedance_table),
});
