import { describe, expect, it } from 'vitest';
import { PseudoCost } from './pseudo-cost';

describe('PseudoCost', () => {
  it('counts the unknown as average and moves to its own experience', () => {
    const costs = new PseudoCost(3);
    expect(costs.expect(0)).toBe(1);
    for (let i = 0; i < 50; i++) {
      costs.learn(0, 0.5, 2);
      costs.learn(1, 0.5, 0);
    }
    expect(costs.expect(2)).toBeCloseTo(2, 9);
    expect(costs.expect(0)).toBeGreaterThan(3.8);
    expect(costs.expect(1)).toBeLessThan(0.2);
  });
});
