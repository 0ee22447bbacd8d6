import {
  biasCurveSchema,
  esrTableSchema,
  impedanceTableSchema,
  type PartFields,
  temperatureCurveSchema,
} from '@shared/schemas/part.schema';
import { formatInput } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { z } from 'zod';
import { readPoints } from '@/lib/points-text';

/** How a curve or table of a part is typed: one point a line, a number a column. */
export interface CurveField {
  label: string;
  units: readonly UnitSymbol[];
  columns: string;
  examples: readonly string[];
  /** What stands in while it is empty. */
  empty: string;
}

export type CurveName = 'bias_curve' | 'temperature_curve' | 'esr_table' | 'impedance_table';

export const CURVES: Readonly<Record<CurveName, CurveField>> = {
  bias_curve: {
    label: 'capacitance over DC bias',
    units: ['V', ''],
    columns: 'volts and C ÷ C(0 V), from 0 V on, e.g. 3.3 0.62',
    examples: ['0', '1'],
    empty: 'empty: estimated from dielectric, case and V ÷ rated',
  },
  temperature_curve: {
    label: 'capacitance over temperature',
    units: ['', ''],
    columns: '°C and C ÷ C(25 °C), e.g. -55 0.9',
    examples: ['-55', '0.9'],
    empty: 'empty: the limits of the dielectric’s code, or the usual drift',
  },
  esr_table: {
    label: 'ESR over frequency',
    units: ['Hz', 'Ω'],
    columns: 'frequency and ESR, e.g. 100k 6m; counts instead of the ESR above',
    examples: ['100k', '6m'],
    empty: 'empty: the ESR above at every frequency',
  },
  impedance_table: {
    label: 'measured impedance of the part alone',
    units: ['Hz', 'Ω', 'Ω'],
    columns: 'frequency, Re Z, Im Z, e.g. 1M 39m -1.59; counts instead of C, ESR and ESL',
    examples: ['1M', '39m', '-1.59'],
    empty: 'empty: computed from C, ESR and ESL',
  },
};

/** Text of a curve → its points, null when empty; a fault names the line that it stands on. */
const pointsOf = <T extends z.ZodType>(name: CurveName, schema: T) =>
  z.string().transform((text, ctx): z.output<T> | null => {
    if (text.trim() === '') return null;
    const { units, examples } = CURVES[name];
    const read = readPoints(text, units, examples);
    const refuse = (message: string) => {
      ctx.addIssue({ code: 'custom', message });
      return z.NEVER;
    };
    if (!read.ok) return refuse(read.reason);
    const checked = schema.safeParse(read.rows);
    if (checked.success) return checked.data;
    const { path, message } = checked.error.issues[0];
    const line = typeof path[0] === 'number' ? read.lines[path[0]] : undefined;
    return refuse(line === undefined ? message : `line ${line}: ${message}`);
  });

export const curveShape = {
  bias_curve: pointsOf('bias_curve', biasCurveSchema),
  temperature_curve: pointsOf('temperature_curve', temperatureCurveSchema),
  esr_table: pointsOf('esr_table', esrTableSchema),
  impedance_table: pointsOf('impedance_table', impedanceTableSchema),
};

/** With prefixes where they help (`100k`); volts, degrees and factors plain. */
const written = (value: number, unit: UnitSymbol): string =>
  unit === 'Hz' || unit === 'Ω' ? formatInput(value) : String(value);

/** A curve as it stands in its field; reading it gives the same points. */
export const curveText = (name: CurveName, points: PartFields[CurveName]): string =>
  (points ?? [])
    .map((row) => row.map((value, k) => written(value, CURVES[name].units[k])).join(' '))
    .join('\n');
