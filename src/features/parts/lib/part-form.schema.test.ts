import type { Part } from '@shared/schemas/part.schema';
import { describe, expect, it } from 'vitest';
import { EMPTY_PART, partFormInput, partFormSchema } from './part-form.schema';

const typed = {
  ...EMPTY_PART,
  partNumber: 'TG-100N-16-0402',
  dielectric: 'X7R',
  caseSize: '0402',
  capacitance_F: '4u7',
  rated_voltage_V: '6.3 V',
  esr_ohm: '12m',
  esl_H: '0.5 nH',
  mount_H: '700p',
  height_mm: '0.55 mm',
  unit_cost: '0.012',
};

describe('the part form', () => {
  it('reads what an engineer types', () => {
    expect(partFormSchema.parse(typed)).toMatchObject({
      capacitance_F: 4.7e-6,
      rated_voltage_V: 6.3,
      esr_ohm: 0.012,
      esl_H: 5e-10,
      mount_H: 7e-10,
      height_mm: 0.55,
      unit_cost: 0.012,
      area_mm2: null,
    });
  });

  it('says at each field what is wrong, all at once', () => {
    const result = partFormSchema.safeParse({
      ...typed,
      partNumber: '',
      capacitance_F: '4.7 V',
      esr_ohm: '-1',
    });
    const paths = result.error?.issues.map((issue) => issue.path.join('.'));
    expect(paths).toEqual(expect.arrayContaining(['partNumber', 'capacitance_F', 'esr_ohm']));
  });

  it('reads curves one point a line, and nothing as not known', () => {
    const fields = partFormSchema.parse({
      ...typed,
      bias_curve: '# V, factor\n0 1\n3.3 0.62\n6V3 0.24',
      impedance_table: '1M 39m -1.59\n30M 21m 4m',
      ageing_percent_per_decade: '2 %',
    });
    expect(fields).toMatchObject({
      bias_curve: [
        [0, 1],
        [3.3, 0.62],
        [6.3, 0.24],
      ],
      impedance_table: [
        [1e6, 0.039, -1.59],
        [3e7, 0.021, 0.004],
      ],
      ageing_percent_per_decade: 2,
      temperature_curve: null,
      esr_table: null,
      esr_tolerance_percent: null,
    });
  });

  it.each([
    ['bias_curve', '0 1\n\n# later\n5 0.6\n3 0.8', 'line 5: voltage must rise from point to point'],
    ['bias_curve', '0 1\n3.3 x', 'line 2: “x” is not a number'],
    ['bias_curve', '1 1\n3.3 0.7', 'the first point is 0 V with factor 1'],
    ['temperature_curve', '-55 0.9\n25 -1', 'line 2: the factor must be above zero'],
    ['esr_table', '1k 5m', 'a table needs at least two points'],
    ['impedance_table', '1M 39m\n2M 1 1', 'line 1: 3 numbers are wanted, 2 stand there'],
  ])('says at %s on which line it is wrong', (name, text, message) => {
    const issues = partFormSchema.safeParse({ ...typed, [name]: text }).error?.issues ?? [];
    expect(issues.map((issue) => [issue.path.join('.'), issue.message])).toEqual([[name, message]]);
  });

  it('gives a saved part back unchanged', () => {
    const fields = partFormSchema.parse({
      ...typed,
      temperature_curve: '-55 0.9\n25 1\n125 0.87',
      esr_table: '100 57m\n1M 5.58m',
      impedance_table: '10k 1.93 -159.2\n1G 0.1194 1.883',
      esl_tolerance_percent: '12.5',
    });
    const part: Part = {
      ...fields,
      id: '00000000-0000-4000-8000-000000000001',
      state: 'draft',
      version: 1,
      createdAt: '2026-01-01T00:00:00.000Z',
      updatedAt: '2026-01-01T00:00:00.000Z',
      updatedBy: null,
    };
    expect(partFormSchema.parse(partFormInput(part))).toEqual(fields);
  });
});
