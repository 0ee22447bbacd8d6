import { describe, expect, it } from 'vitest';
import { budgetFigures, isSpent, overspentText } from './budget';

const budget = { tolerance_percent: 5, setpoint_percent: 1, dc_drop_V: 0.01, regulator_ripple_V: 0.008 };

describe('a noise budget', () => {
  it('adds up in volt and per cent', () => {
    const { tolerance, spent, left } = budgetFigures(budget, 1.8);
    expect(tolerance.volts).toBeCloseTo(0.09, 12);
    expect(spent.setpoint.volts).toBeCloseTo(0.018, 12);
    expect(spent.drop.percent).toBeCloseTo(0.5556, 4);
    expect(left.percent).toBeCloseTo(3, 12);
    for (const unit of ['volts', 'percent'] as const)
      expect(spent.setpoint[unit] + spent.drop[unit] + spent.regulator[unit] + left[unit]).toBeCloseTo(
        tolerance[unit],
        12,
      );
  });

  it('is spent when nothing but rounding is left', () => {
    expect(isSpent(budgetFigures(budget, 1.8))).toBe(false);
    // 0.3 − 0.1 − 0.2 is −5.6e-17 in double precision, 0.3 − 0.2 − 0.1 is −2.8e-17.
    const even = { ...budget, tolerance_percent: 0.3, setpoint_percent: 0.1, dc_drop_V: 0.002 };
    const figures = budgetFigures({ ...even, regulator_ripple_V: 0 }, 1);
    expect(isSpent(figures)).toBe(true);
    expect(overspentText(figures)).toBe('nothing is left for the bank: the tolerance is spent');
  });

  it('says by how much it is overspent', () => {
    const figures = budgetFigures({ ...budget, dc_drop_V: 0.1 }, 1.8);
    expect(isSpent(figures)).toBe(true);
    expect(overspentText(figures)).toBe('nothing is left for the bank: overspent by 36\u00a0mV (2\u00a0%)');
  });
});
