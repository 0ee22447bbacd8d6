import { describe, expect, it } from 'vitest';
import { boundAbove, budgetBelow, isClosed, nextBudget } from './budget';

describe('deepening', () => {
  it.each([0, 1] as const)(
    'step %i: reaches the incumbent in a few passes, never past it, and closes',
    (step) => {
      const incumbent = step === 1 ? 66 : 6.6180339;
      let bound = 0;
      let passes = 0;
      while (!isClosed({ step }, bound, incumbent)) {
        const budget = nextBudget({ step }, bound, incumbent, 1000, 0);
        expect(budget).toBeLessThan(incumbent);
        expect(budget).toBeGreaterThanOrEqual(bound);
        const above = boundAbove({ step }, budget);
        expect(above).toBeGreaterThan(bound);
        bound = above;
        passes++;
      }
      expect(passes).toBeLessThan(20);
      expect(budgetBelow({ step }, incumbent)).toBeLessThan(incumbent);
    },
  );

  it.each([0, 1] as const)('step %i: without an incumbent it ends at the weight of everything', (step) => {
    const most = 400;
    let budget = 0;
    let bound = 0;
    for (let pass = 0; pass < 60 && budget < most; pass++) {
      budget = nextBudget({ step }, bound, null, most, 20);
      bound = boundAbove({ step }, budget);
    }
    expect(budget).toBe(most);
  });
});
