import { inService } from '@shared/engine/service/in-service';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainDecimals, chainText, factorChain } from './factor-chain';
import { ageOfYears_h, CATALOGUE, type Situation } from './situation';

const part = {
  capacitance_F: 22e-6,
  esr_ohm: 0.003,
  esl_H: 5e-10,
  technology: 'ceramic',
  dielectric: 'X6S',
  case: '0805',
  tolerance: 'M',
  rated_voltage_V: 6.3,
  bias_curve: [
    [0, 1],
    [3.3, 0.52],
    [6.3, 0.24],
  ],
  temperature_curve: [
    [-55, 0.85],
    [-40, 0.93],
    [25, 1],
    [105, 0.83],
  ],
  ageing_percent_per_decade: 2.5,
} satisfies Parameters<typeof inService>[0];

const chain = (change: Partial<Situation>, of: Parameters<typeof inService>[0] = part) => {
  const at = { ...CATALOGUE, ...change };
  return factorChain(of, at, inService(of, at));
};
/** The numbers that stand in the chain, multiplied as a reader would. */
const multiplied = ({ start, terms }: ReturnType<typeof chain>) =>
  terms.reduce((product, { text }) => product * Number(text), Number(start.split('\u00a0')[0]));

describe('the chain of factors', () => {
  it('reads as an engineer writes it, each factor with its condition and where it comes from', () => {
    // 22 × 0.52 × 0.93 × 0.9514 × 0.8 = 8.10, with 1 − 0.025·log10(87.66) = 0.95143 for ten years; 0.951 would give 8.09.
    const aged = chain({
      voltage_V: 3.3,
      temperature_C: -40,
      age_h: ageOfYears_h(10),
      capacitance: 'low',
    });
    expect(chainText(aged)).toBe(
      '22\u00a0µF × bias 0.52 × cold 0.93 × aged 0.9514 × tolerance 0.8 = 8.10\u00a0µF',
    );
    expect(aged.terms.map(({ basis }) => basis)).toEqual([
      '3.3\u00a0V, bias curve',
      '−40\u00a0°C, temperature curve',
      '10 years, own rate',
      'letter M, low end',
    ]);
  });

  it('names what is warm, hot, new and as in the catalogue', () => {
    const names = (change: Partial<Situation>) => chain(change).terms.map(({ name }) => name);
    expect(names({})).toEqual(['bias', 'temperature', 'new', 'tolerance']);
    expect(names({ temperature_C: 45 })[1]).toBe('warm');
    expect(names({ temperature_C: 85, age_h: ageOfYears_h(1) }).slice(1, 3)).toEqual(['hot', 'aged']);
  });

  it('marks what is estimated and nothing else', () => {
    const { bias_curve: _, ...without } = part;
    const guessed = chain({ voltage_V: 3.3, temperature_C: -40 }, without);
    expect(guessed.terms.map(({ estimated }) => estimated)).toEqual([true, false, false, false]);
    expect(chainText(guessed)).toContain('× bias ≈ 0.');
  });

  it('shows numbers that multiply to the result, digit for digit', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(22e-6, 4.7e-6, 100e-9, 47e-12),
        fc.double({ min: 0, max: 6.3, noNaN: true }),
        fc.double({ min: -55, max: 105, noNaN: true }),
        fc.double({ min: 1000, max: 2e5, noNaN: true }),
        fc.constantFrom('low' as const, 'nominal' as const, 'high' as const),
        (capacitance_F, voltage_V, temperature_C, age_h, capacitance) => {
          const one = chain({ voltage_V, temperature_C, age_h, capacitance }, { ...part, capacitance_F });
          const [start] = one.start.split('\u00a0');
          const product_F = multiplied(one) * (capacitance_F / Number(start));
          const [digits] = one.result.split('\u00a0');
          // The result as it stands, in the unit of its prefix: its last digit is right to half a step.
          const scale = 1000 ** Math.floor(Math.log10(product_F * 1.0006) / 3);
          const step = 10 ** -(digits.split('.')[1]?.length ?? 0);
          expect(Math.abs(product_F / scale - Number(digits))).toBeLessThanOrEqual(step * 0.500001);
        },
      ),
      { seed: 20_261_201, numRuns: 400 },
    );
  });

  it('takes more decimals only where fewer would not come out', () => {
    expect(chainDecimals(22e-6, [0.5, 0.8], 8.8e-6)).toBe(2);
    expect(chainDecimals(22e-6, [0.5234, 0.9312], 22e-6 * 0.5234 * 0.9312)).toBeGreaterThan(2);
  });
});
