import { describe, expect, it } from 'vitest';
import { weightUnit } from './weight-unit';

describe('weightUnit', () => {
  it('finds the unit of prices', () => {
    const { unit, step } = weightUnit([0.3, 0.025, 0.1]);
    expect(unit).toBeCloseTo(0.025, 12);
    expect(step).toBe(1);
    expect(weightUnit([1, 1, 1])).toEqual({ unit: 1, step: 1 });
    expect(weightUnit([0.1, 0.2, 0.30000000000000004]).step).toBe(1);
  });

  it('takes reals as reals', () => {
    expect(weightUnit([1, Math.SQRT2])).toEqual({ unit: Math.SQRT2, step: 0 });
    expect(weightUnit([1, 1 + 1e-8]).step).toBe(0);
  });
});
