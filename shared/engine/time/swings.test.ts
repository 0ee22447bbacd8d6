import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fewestSwings, largeSwings, wayOf } from './swings';

const turnsOf = (...heights: number[]) => heights.map((ohm, at_s) => ({ at_s, ohm }));
const heights = (turns: readonly { ohm: number }[]) => turns.map(({ ohm }) => ohm);

describe('swings of a response', () => {
  it('have a way up and a way down', () => {
    const turns = turnsOf(0, 5, 3, 4, 1);
    expect([wayOf(turns, 1), wayOf(turns, -1)]).toEqual([6, 5]);
  });

  it('are passed over when small, wherever they are', () => {
    expect(heights(largeSwings(turnsOf(0, 5, 3, 4, 1), 2))).toEqual([0, 5, 1]);
    expect(heights(largeSwings(turnsOf(0, 1, -1, 1, -1), 1.5))).toEqual([1, -1, 1, -1]);
    expect(heights(largeSwings(turnsOf(0, 1, 0.5, 6, 5.5), 2))).toEqual([0, 6]);
    expect(heights(largeSwings(turnsOf(0, -1, 4, 2), 1.5))).toEqual([-1, 4, 2]);
    expect(heights(largeSwings(turnsOf(0, 1), 2))).toEqual([]);
  });

  it('keep their share of the way, with the fewest turns that a threshold allows', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -10, max: 10, noNaN: true }), { minLength: 2, maxLength: 200 }),
        fc.constantFrom(1 as const, -1 as const),
        (list, sign) => {
          const turns = turnsOf(0, ...list);
          const all = wayOf(turns, sign);
          fc.pre(all > 0.1);
          const kept = fewestSwings(turns, sign, 0.05, 1000);
          expect(wayOf(kept, sign)).toBeGreaterThanOrEqual(0.95 * all);
          expect(kept.length).toBeLessThanOrEqual(turns.length);
        },
      ),
      { numRuns: 300, seed: 44 },
    );
  });

  it('go down to a number of turns, and then keep the largest', () => {
    const turns = turnsOf(...Array.from({ length: 101 }, (_, i) => (i % 2) * (1 + i)));
    const kept = fewestSwings(turns, 1, 0, 20);
    expect(kept.length).toBeLessThanOrEqual(20);
    expect(kept.length).toBeGreaterThan(15);
    expect(Math.max(...heights(kept))).toBe(100);
  });
});
