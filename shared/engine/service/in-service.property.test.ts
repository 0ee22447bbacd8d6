import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inService, type ServiceState } from './in-service';
import type { CurvePoints, PartBehaviour } from './part-behaviour';

const RATED_V = 6.3;
const ENDS = ['low', 'nominal', 'high'] as const;
const end = fc.constantFrom(...ENDS);
const class2 = fc.constantFrom('X7R', 'X5R', 'X6S', 'X7T', 'Y5V', 'Z5U', '2R1', '2F4', 'unknown');
const caseCode = fc.constantFrom('01005', '0201', '0402', '0603', '1206', '1812', 'odd');

const curve = (first: number): fc.Arbitrary<CurvePoints> =>
  fc
    .array(
      fc.tuple(fc.double({ min: 0.1, max: 50, noNaN: true }), fc.double({ min: 0.02, max: 2, noNaN: true })),
      {
        minLength: 1,
        maxLength: 6,
      },
    )
    .map((steps) => {
      let x = first;
      return [
        [first, 1] as const,
        ...steps.map(([step, factor]) => {
          x += step;
          return [x, factor] as const;
        }),
      ];
    });
const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });

const anyPart: fc.Arbitrary<PartBehaviour> = fc.record({
  capacitance_F: fc.double({ min: 20e-12, max: 1e-2, noNaN: true }),
  esr_ohm: fc.double({ min: 0, max: 1, noNaN: true }),
  esl_H: fc.double({ min: 0, max: 1e-8, noNaN: true }),
  technology: maybe(fc.constantFrom('ceramic', 'polymer', 'tantalum', 'aluminium', 'film', 'wood')),
  dielectric: maybe(fc.oneof(class2, fc.constantFrom('C0G', 'NP0', 'U2J', 'M7G'))),
  case: maybe(caseCode),
  tolerance: maybe(fc.constantFrom('F', 'G', 'J', 'K', 'M', 'Z')),
  rated_voltage_V: fc.constantFrom(RATED_V, undefined),
  bias_curve: maybe(curve(0)),
  temperature_curve: maybe(curve(-60)),
  ageing_percent_per_decade: maybe(fc.double({ min: 0, max: 10, noNaN: true })),
  esr_tolerance_percent: maybe(fc.double({ min: 0, max: 90, noNaN: true })),
  esl_tolerance_percent: maybe(fc.double({ min: 0, max: 90, noNaN: true })),
});
const anyState: fc.Arbitrary<ServiceState> = fc.record({
  voltage_V: fc.double({ min: 0, max: RATED_V, noNaN: true }),
  temperature_C: fc.double({ min: -60, max: 150, noNaN: true }),
  age_h: fc.double({ min: 0, max: 1e6, noNaN: true }),
  capacitance: end,
  esr: end,
  esl: end,
});

describe('any part in any service', () => {
  it('has factors above zero whose product is what is left', () => {
    fc.assert(
      fc.property(anyPart, anyState, (part, state) => {
        const values = inService(part, state);
        for (const { factor, basis } of values.factors) {
          expect(factor).toBeGreaterThan(0);
          expect(Number.isFinite(factor)).toBe(true);
          expect(basis).not.toBe('');
        }
        const product = values.factors.reduce((all, one) => all * one.factor, part.capacitance_F);
        expect(values.capacitance_F / product).toBeCloseTo(1, 12);
        expect(values.esr_ohm).toBe(part.esr_ohm * values.esr_factor);
        expect(values.esl_H).toBe(part.esl_H * values.esl_factor);
      }),
      { numRuns: 600, seed: 5 },
    );
  });

  it('is at worst no better than nominal, and at best no worse', () => {
    fc.assert(
      fc.property(anyPart, anyState, (part, state) => {
        const [low, nominal, high] = ENDS.map((all) =>
          inService(part, { ...state, capacitance: all, esr: all, esl: all }),
        );
        for (const value of ['capacitance_F', 'esr_ohm', 'esl_H'] as const) {
          expect(low[value]).toBeLessThanOrEqual(nominal[value]);
          expect(nominal[value]).toBeLessThanOrEqual(high[value]);
        }
      }),
      { numRuns: 600, seed: 6 },
    );
  });

  it('loses capacitance with voltage by the class 2 estimate, more the higher', () => {
    const volts = fc.double({ min: 0, max: RATED_V, noNaN: true });
    fc.assert(
      fc.property(class2, caseCode, volts, volts, (dielectric, size, a, b) => {
        const part: PartBehaviour = {
          capacitance_F: 1e-5,
          esr_ohm: 0.01,
          esl_H: 1e-9,
          technology: 'ceramic',
          dielectric,
          case: size,
          rated_voltage_V: RATED_V,
        };
        const left = (voltage_V: number) =>
          inService(part, {
            voltage_V,
            temperature_C: 25,
            age_h: 1000,
            capacitance: 'nominal',
            esr: 'nominal',
            esl: 'nominal',
          }).capacitance_factor;
        expect(left(Math.max(a, b))).toBeLessThanOrEqual(left(Math.min(a, b)));
        expect(left(RATED_V)).toBeLessThan(0.6);
      }),
      { numRuns: 400, seed: 7 },
    );
  });
});
