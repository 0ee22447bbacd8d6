import type { SearchProgress } from '@shared/search/problem';
import { runSearch } from '@shared/search/search';
import { describe, expect, it } from 'vitest';
import { lightestByEnumeration, mixHolds, weightOfMix } from '../helpers/enumerate-mixes';
import { type SmallOptions, smallSearch } from '../helpers/small-search';

/** The search against trying every combination; each with its own seed, so that no two share a network. */
const CASES: [string, number, SmallOptions][] = [
  ['fewest parts', 1, {}],
  ['fewest parts, many pieces', 2, { kinds: 4, max: 8 }],
  ['cheapest', 3, { minimise: 'cost' }],
  ['cheapest, real prices under a mask', 4, { minimise: 'cost', mask: true }],
  ['smallest area (weights are reals)', 5, { minimise: 'area' }],
  ['smallest area, six kinds', 6, { minimise: 'area', kinds: 6, max: 3 }],
  ['two kinds at most', 7, { maxKinds: 2, max: 6 }],
  ['one kind, cheapest', 8, { maxKinds: 1, max: 8, minimise: 'cost' }],
  ['a minimum', 9, { withMinimum: true }],
  ['a minimum and two kinds, smallest', 10, { withMinimum: true, maxKinds: 2, minimise: 'area', max: 6 }],
  ['a mask', 11, { mask: true, max: 5 }],
  ['seen from the die', 12, { observe: 'die' }],
  ['seen from the die, cheapest', 13, { observe: 'die', minimise: 'cost', kinds: 4, max: 7 }],
  ['seen from the die, two kinds, mask', 14, { observe: 'die', mask: true, maxKinds: 2, max: 6 }],
  ['locked lines', 15, { locked: true, kinds: 4, max: 6 }],
  ['locked lines, smallest area', 16, { locked: true, minimise: 'area' }],
  ['a target that may be out of reach', 17, { ease: 0.7 }],
  ['a target that may be out of reach, from the die', 18, { ease: 0.7, observe: 'die' }],
  ['a target that may be out of reach, cheapest', 19, { ease: 0.8, minimise: 'cost', maxKinds: 3 }],
  ['a target far out of reach', 20, { ease: 0.2 }],
];

describe('the search equals exhaustive enumeration', () => {
  it.each(CASES)('%s', (_, seed, options) => {
    for (const shift of [0, 100, 200]) {
      const problem = smallSearch(seed + shift, options);
      const lightest = lightestByEnumeration(problem);
      const stream: SearchProgress[] = [];
      const result = runSearch(problem, { gridPoints: 60 }, (progress) => stream.push({ ...progress }));
      if (lightest === null) {
        expect(result.found).toBe(false);
        if (!result.found) {
          expect(result.impossible).toBe(true);
          expect(result.reason.length).toBeGreaterThan(20);
        }
        continue;
      }
      expect(result.found).toBe(true);
      if (!result.found) continue;
      expect(result.weight).toBeCloseTo(lightest, 8);
      expect(result.proven).toBe(true);
      expect(result.lowerBound).toBeLessThanOrEqual(lightest * (1 + 1e-9));
      for (const { lowerBound } of stream) expect(lowerBound).toBeLessThanOrEqual(lightest * (1 + 1e-9));
      for (const { mix, weight, headroom_dB } of stream) {
        if (!mix) continue;
        const counts = problem.candidates.map((c) => mix.find(({ id }) => id === c.id)?.count ?? 0);
        expect(mixHolds(problem, counts)).toBe(true);
        expect(weightOfMix(problem, mix)).toBeCloseTo(weight as number, 8);
        expect(headroom_dB).toBeGreaterThan(-1e-7);
        expect(mix.length).toBeLessThanOrEqual(problem.maxKinds ?? Number.POSITIVE_INFINITY);
        problem.candidates.forEach((c, k) => {
          expect(counts[k]).toBeGreaterThanOrEqual(c.min ?? 0);
          expect(counts[k]).toBeLessThanOrEqual(c.max as number);
        });
      }
    }
  });
});
