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

  it('gives a saved part back unchanged', () => {
    const fields = partFormSchema.parse(typed);
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
