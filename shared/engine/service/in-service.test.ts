import { documentPartSchema } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { inService, type ServiceState } from './in-service';
import type { PartBehaviour } from './part-behaviour';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const bare: PartBehaviour = { capacitance_F: 22e-6, esr_ohm: 0.004, esl_H: 4e-10 };
const part: PartBehaviour = {
  ...bare,
  technology: 'ceramic',
  dielectric: 'X5R',
  case: '0603',
  tolerance: 'M',
  rated_voltage_V: 6.3,
};
const state = (more: Partial<ServiceState> = {}): ServiceState => ({
  voltage_V: 3.15,
  temperature_C: 60,
  age_h: 1e5,
  capacitance: 'nominal',
  esr: 'nominal',
  esl: 'nominal',
  ...more,
});

describe('a part in service', () => {
  it('is its catalogue value times four factors that are all shown', () => {
    const values = inService(part, state());
    expect(values.factors.map((one) => one.kind)).toEqual(['bias', 'temperature', 'ageing', 'tolerance']);
    expect(values.factors.map((one) => one.factor)).toEqual([1 / 1.4, 1, 0.95, 1]);
    expect(values.capacitance_factor).toBeCloseTo(0.95 / 1.4, 14);
    expect(values.capacitance_F).toBeCloseTo((22e-6 * 0.95) / 1.4, 18);
    expect(values).toMatchObject({
      esr_ohm: 0.004,
      esl_H: 4e-10,
      esr_factor: 1,
      esl_factor: 1,
      estimated: true,
    });
    expect(values.factors[3].basis).toBe('letter M, middle');
  });

  it('takes the ends of tolerance and temperature together', () => {
    const low = inService(part, state({ capacitance: 'low' }));
    expect(low.factors.map((one) => one.factor)).toEqual([1 / 1.4, 0.85, 0.95, 0.8]);
    const high = inService(part, state({ capacitance: 'high' }));
    expect(high.factors.map((one) => one.factor)).toEqual([1 / 1.4, 1.15, 0.95, 1.2]);
    expect(low.factors[3].basis).toBe('letter M, low end');
  });

  it('lets usual tolerances of ESR and ESL stand in, marked', () => {
    const c0g: PartBehaviour = { ...bare, dielectric: 'C0G', tolerance: 'J' };
    const still = state({ temperature_C: 25, age_h: 1000 });
    expect(inService(c0g, still).estimated).toBe(false);
    expect(inService(c0g, { ...still, esr: 'high' })).toMatchObject({ esr_factor: 1.3, estimated: true });
    expect(inService(c0g, { ...still, esl: 'low' })).toMatchObject({ esl_factor: 0.8, estimated: true });
    const own = { ...c0g, esr_tolerance_percent: 50, esl_tolerance_percent: 10 };
    expect(inService(own, { ...still, esr: 'low', esl: 'high' })).toMatchObject({
      esr_ohm: 0.002,
      esl_factor: 1.1,
      estimated: false,
    });
  });

  it('takes a bare part as it stands in every corner', () => {
    for (const end of ['low', 'nominal', 'high'] as const)
      expect(inService(bare, state({ capacitance: end, esr: end, esl: end }))).toMatchObject({
        capacitance_F: 22e-6,
        esr_ohm: 0.004,
        esl_H: 4e-10,
        estimated: false,
      });
    expect(inService({ ...bare, tolerance: 'K' }, state({ capacitance: 'low' })).capacitance_factor).toBe(
      0.9,
    );
  });

  it('marks the ends of a tolerance that nobody stated', () => {
    const polymer: PartBehaviour = { ...bare, technology: 'polymer' };
    const still = state({ temperature_C: 20, age_h: 1000 });
    expect(inService(polymer, still).estimated).toBe(false);
    expect(inService(polymer, { ...still, capacitance: 'low' })).toMatchObject({
      capacitance_factor: 1,
      estimated: true,
    });
  });

  it('takes a part of a document as it is', () => {
    const fromFile = documentPartSchema.parse({
      id: 'C1',
      ...part,
      bias_curve: [
        [0, 1],
        [6.3, 0.5],
      ],
      temperature_curve: [
        [-55, 0.9],
        [25, 1],
        [85, 0.9],
        [125, 0.9],
      ],
      ageing_percent_per_decade: 1,
    });
    const values = inService(fromFile, state({ voltage_V: 6.3, temperature_C: 100 }));
    expect(values.factors.map((one) => one.factor)).toEqual([0.5, 0.9, 0.98, 1]);
    expect(values.estimated).toBe(false);
  });
});

describe('where a part in service is refused', () => {
  it.each([
    ['capacitance_F', { capacitance_F: 0 }],
    ['capacitance_F', { capacitance_F: -1e-6 }],
    ['capacitance_F', { capacitance_F: Number.NaN }],
    ['esr_ohm', { esr_ohm: -1 }],
    ['esr_ohm', { esr_ohm: Number.POSITIVE_INFINITY }],
    ['esl_H', { esl_H: Number.NaN }],
    ['tolerance', { tolerance: 'Q' }],
    ['tolerance', { tolerance: 'C' }],
    ['rated_voltage_V', { rated_voltage_V: 2.5 }],
    ['esr_tolerance_percent', { esr_tolerance_percent: 100 }],
    ['esr_tolerance_percent', { esr_tolerance_percent: -1 }],
    ['esl_tolerance_percent', { esl_tolerance_percent: Number.NaN }],
    ['ageing_percent_per_decade', { ageing_percent_per_decade: -1 }],
  ])('the field is %s for %o', (field, wrong) =>
    expect(() => inService({ ...part, ...wrong }, state())).toThrow(fault(field)),
  );

  it.each([
    ['voltage_V', { voltage_V: -1 }],
    ['temperature_C', { temperature_C: Number.NaN }],
    ['age_h', { age_h: -1 }],
  ])('the field is %s for %o', (field, wrong) =>
    expect(() => inService(part, state(wrong))).toThrow(fault(field)),
  );

  it('nothing may be left of a capacitance', () => {
    // −7500 ± 2500 ppm/K, 100 K above its reference: the low end is zero.
    const steep: PartBehaviour = { ...bare, dielectric: 'U3N' };
    const hot = state({ temperature_C: 125, capacitance: 'low' });
    expect(() => inService(steep, hot)).toThrow(fault('capacitance_F'));
    expect(inService(steep, { ...hot, capacitance: 'nominal' }).capacitance_factor).toBeCloseTo(0.25, 12);
  });
});
