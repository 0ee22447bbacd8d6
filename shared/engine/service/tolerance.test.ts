import { describe, expect, it } from 'vitest';
import { toleranceFactors } from './tolerance';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('tolerance letters', () => {
  it('stand for per cent at any value', () => {
    expect(toleranceFactors('K', 1e-7)).toEqual({ low: 0.9, high: 1.1 });
    expect(toleranceFactors('m', 1e-5)).toEqual({ low: 0.8, high: 1.2 });
    expect(toleranceFactors('Z', 1e-6)).toEqual({ low: 0.8, high: 1.8 });
    expect(toleranceFactors('F', 1e-12)).toEqual({ low: 0.99, high: 1.01 });
    expect(toleranceFactors('G', 1e-12)).toEqual({ low: 0.98, high: 1.02 });
  });

  it('stand for picofarad with B, C and D, below 10 pF only', () => {
    expect(toleranceFactors('C', 5e-12).low).toBeCloseTo(0.95, 12);
    expect(toleranceFactors('B', 9.9e-12).high).toBeCloseTo(1 + 0.1 / 9.9, 12);
    for (const letter of ['B', 'C', 'D'])
      for (const value of [10e-12, 10 * 1e-12, 1e-9])
        expect(() => toleranceFactors(letter, value)).toThrow(fault('tolerance'));
  });

  it('leave something of the part', () => {
    expect(toleranceFactors('D', 0.51e-12).low).toBeGreaterThan(0);
    expect(() => toleranceFactors('D', 0.5e-12)).toThrow(fault('tolerance'));
    expect(() => toleranceFactors('C', 0.2e-12)).toThrow(fault('tolerance'));
  });

  it('are refused when unknown, and so are values that are none', () => {
    for (const letter of ['', 'A', 'KK', '±5 %'])
      expect(() => toleranceFactors(letter, 1e-6)).toThrow(fault('tolerance'));
    for (const value of [0, -1e-6, Number.NaN, Number.POSITIVE_INFINITY])
      expect(() => toleranceFactors('K', value)).toThrow(fault('capacitance_F'));
  });
});
