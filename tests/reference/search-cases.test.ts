import { EngineError } from '@shared/engine/errors';
import { flatTarget } from '@shared/engine/target';
import type { MixCandidate, MixProblem, SearchResult } from '@shared/search/problem';
import { runSearch, searchMix } from '@shared/search/search';
import { describe, expect, it } from 'vitest';
import { mixHolds } from '../helpers/enumerate-mixes';
import { searchCase } from '../helpers/search-case';
import { smallSearch } from '../helpers/small-search';

/** Everything but the clock. */
const timeless = (result: SearchResult): SearchResult => ({ ...result, seconds: 0 });

describe('the published cases', () => {
  it.each([
    [1, 13],
    [2, 17],
  ])('case %i: %i parts, proven', (number, weight) => {
    const problem = searchCase(number);
    const result = runSearch(problem);
    expect(result).toMatchObject({
      found: true,
      weight,
      lowerBound: weight,
      proven: true,
      holds: true,
      parts: weight,
    });
    if (!result.found) return;
    const counts = problem.candidates.map((c) => result.mix.find(({ id }) => id === c.id)?.count ?? 0);
    expect(mixHolds(problem, counts)).toBe(true);
    expect(result.tightest.headroom_dB).toBeGreaterThan(-1e-7);
  });

  it('case 4: at most 66 parts and a bound above the covering programme at once', () => {
    const result = runSearch(searchCase(4), { seconds: 1.5 });
    expect(result.found).toBe(true);
    if (!result.found) return;
    expect(result.weight).toBeLessThanOrEqual(66);
    expect(result.lowerBound).toBeGreaterThan(40);
    expect(result.lowerBound).toBeLessThanOrEqual(result.weight);
    expect(result.seconds).toBeLessThan(2.5);
  });
});

describe('few kinds and other weights', () => {
  it.each([
    [1, 'parts', 4, 14],
    [1, 'cost', 4, 0.904],
    [2, 'area', 4, 37.62],
    [3, 'cost', 3, 4.322],
    [4, 'area', 3, 623.04],
  ] as const)('case %i by %s with %i kinds: %d, proven', (number, minimise, maxKinds, weight) => {
    const result = runSearch({ ...searchCase(number), minimise, maxKinds }, { seconds: 20 });
    expect(result).toMatchObject({ found: true, proven: true, kinds: maxKinds });
    expect(result.found && result.weight).toBeCloseTo(weight, 9);
  });
});

describe('repeatable and fair', () => {
  it('gives the same answer for the same seed, however it is sliced', () => {
    const problem = smallSearch(41, { kinds: 6, max: 12 });
    const first = timeless(runSearch(problem, { seed: 7 }));
    expect(timeless(runSearch(problem, { seed: 7 }))).toEqual(first);
    expect(timeless(runSearch(problem, { seed: 7, nodeSlice: 13 }))).toEqual(first);
    expect(runSearch(problem, { seed: 8 })).toMatchObject({
      weight: first.found && first.weight,
      proven: true,
    });
  });

  it('does not depend on the order of the candidates', () => {
    for (const minimise of ['parts', 'cost', 'area'] as const) {
      const problem = { ...searchCase(1), minimise, maxKinds: 4, target: flatTarget(0.03) };
      const turned = { ...problem, candidates: [...problem.candidates].reverse() };
      const a = runSearch(problem, { seconds: 10 });
      const b = runSearch(turned, { seconds: 10 });
      expect(a).toMatchObject({ found: true, proven: true });
      expect(b).toMatchObject({ found: true, proven: true, weight: a.found && a.weight });
    }
  });

  it('yields often, so that a worker sees a cancel, and never lets the bound fall or the weight rise', () => {
    const search = searchMix(searchCase(4), { seconds: 1 });
    let last = Date.now();
    let longest = 0;
    let bound = 0;
    let weight = Number.POSITIVE_INFINITY;
    for (let step = search.next(); !step.done; step = search.next()) {
      longest = Math.max(longest, Date.now() - last);
      last = Date.now();
      expect(step.value.lowerBound).toBeGreaterThanOrEqual(bound);
      bound = step.value.lowerBound;
      if (step.value.weight === null) continue;
      expect(step.value.weight).toBeLessThanOrEqual(weight);
      weight = step.value.weight;
    }
    expect(longest).toBeLessThan(400);
  });
});

describe('what cannot be', () => {
  it('says that the package alone is above the target, and where', () => {
    const problem = searchCase(1);
    problem.network = {
      ...problem.network,
      observe: 'die',
      package: { resistance_ohm: 0.0003, inductance_H: 1.2e-10, die_capacitance_F: 0, die_resistance_ohm: 0 },
    };
    const result = runSearch(problem);
    expect(result).toMatchObject({ found: false, impossible: true });
    if (result.found) return;
    expect(result.reason).toMatch(/package's 120 pH/);
    expect(result.frequency_Hz).toBeGreaterThan(1e7);
  });

  it('names the best candidate when all of them are not enough', () => {
    const problem: MixProblem = { ...searchCase(1), band_Hz: [1e6, 3e7], target: flatTarget(0.0001) };
    const result = runSearch(problem);
    expect(result).toMatchObject({ found: false, impossible: true });
    if (result.found) return;
    expect(result.reason).toMatch(
      /At 30 MHz even 80 of .* the best candidate there, leave .*: its (ESR|inductance|capacitance)/,
    );
    expect(result.frequency_Hz).toBeGreaterThan(1e6);
  });

  it('has tried everything when every frequency alone is within reach', () => {
    const problem = { ...searchCase(1), maxKinds: 1 };
    problem.candidates = problem.candidates.slice(6, 9).map((c) => ({ ...c, max: 30 }));
    const result = runSearch(problem);
    expect(result).toMatchObject({ found: false, impossible: true });
  });

  it('returns what it knows when the time is up', () => {
    const result = runSearch(searchCase(3), { seconds: 0 });
    expect(result.lowerBound).toBeLessThanOrEqual(26);
    if (result.found) expect(result.weight).toBeGreaterThanOrEqual(26);
    else expect(result.impossible).toBe(false);
  });
});

describe('bad input', () => {
  const base = searchCase(1);
  /** The case with candidate `index` changed. */
  const withCandidate = (index: number, change: Partial<MixCandidate>): MixProblem => ({
    ...base,
    candidates: base.candidates.map((c, i) => (i === index ? { ...c, ...change } : c)),
  });
  it.each<[string, MixProblem]>([
    ['candidates', { ...base, candidates: [] }],
    ['candidates[2].cost', { ...withCandidate(2, { cost: undefined }), minimise: 'cost' }],
    ['candidates[1].area_mm2', { ...withCandidate(1, { area_mm2: 0 }), minimise: 'area' }],
    ['candidates[0].min', withCandidate(0, { min: -1 })],
    ['candidates[0].max', withCandidate(0, { max: 1.5 })],
    ['candidates[3].id', withCandidate(3, { id: base.candidates[1].id })],
    [
      'candidates[4].line.esr_ohm',
      withCandidate(4, { line: { ...base.candidates[4].line, esr_ohm: Number.NaN } }),
    ],
    ['band_Hz', { ...base, band_Hz: [1e6, 1e6] }],
    ['band_Hz', { ...base, band_Hz: [0, 1e6] }],
    ['maxKinds', { ...base, maxKinds: 1.5 }],
    ['maxKinds', { ...base, maxKinds: 1, candidates: base.candidates.map((c) => ({ ...c, min: 1 })) }],
  ])('names %s', (field, problem) => {
    let caught: unknown;
    try {
      runSearch(problem);
    } catch (error) {
      caught = error;
    }
    expect(caught).toBeInstanceOf(EngineError);
    expect((caught as EngineError).field).toBe(field);
  });
});
