import { describe, expect, it } from 'vitest';
import { ageingEstimate, ageingFactor, ageingRate, LEAST_AGE_H } from './ageing';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('ageing law', () => {
  it('is linear in decades: 1 at the reference, above it when younger', () => {
    expect(ageingFactor(2.5, 1000)).toBe(1);
    expect(ageingFactor(2.5, 1e5)).toBeCloseTo(0.95, 14);
    expect(ageingFactor(2.5, 100)).toBeCloseTo(1.025, 14);
    expect(ageingFactor(0, 1e9)).toBe(1);
    expect(ageingFactor(7, 10, 1)).toBeCloseTo(0.93, 14);
  });

  it('counts what is younger than an hour as an hour old', () => {
    expect(ageingFactor(2.5, 0)).toBe(ageingFactor(2.5, LEAST_AGE_H));
    expect(ageingFactor(2.5, 0)).toBeCloseTo(1.075, 14);
  });

  it('names what it refuses', () => {
    expect(() => ageingFactor(-1, 1)).toThrow(fault('ageing_percent_per_decade'));
    expect(() => ageingFactor(Number.NaN, 1)).toThrow(fault('ageing_percent_per_decade'));
    expect(() => ageingFactor(1, -1)).toThrow(fault('age_h'));
    expect(() => ageingFactor(1, Number.POSITIVE_INFINITY)).toThrow(fault('age_h'));
    expect(() => ageingFactor(1, 1, 0)).toThrow(fault('reference_h'));
    // 20 % a decade leaves nothing after five decades.
    expect(() => ageingFactor(20, 1e8)).toThrow(fault('age_h'));
  });
});

describe('ageing rate', () => {
  it('is the part’s own before all others', () => {
    expect(ageingRate({ technology: 'ceramic', dielectric: 'Y5V', ageing_percent_per_decade: 3 })).toEqual({
      percentPerDecade: 3,
      estimated: false,
      basis: 'own rate',
    });
    expect(ageingRate({ ageing_percent_per_decade: 0 }).estimated).toBe(false);
    expect(() => ageingRate({ ageing_percent_per_decade: -1 })).toThrow(fault('ageing_percent_per_decade'));
  });

  it.each([
    ['C0G', 0, false],
    ['U2J', 0, false],
    ['X7R', 2.5, true],
    ['X6S', 2.5, true],
    ['2R1', 2.5, true],
    ['Z5U', 5, true],
    ['Y5V', 7, true],
    ['2F4', 7, true],
    ['', 2.5, true],
  ])('of a %s ceramic is %d %% a decade', (dielectric, percentPerDecade, estimated) =>
    expect(ageingRate({ technology: 'ceramic', dielectric })).toMatchObject({ percentPerDecade, estimated }),
  );

  it('is none for the others, and a bare part is taken as it stands', () => {
    for (const technology of ['polymer', 'tantalum', 'aluminium', 'film']) {
      const rate = ageingRate({ technology });
      expect(rate).toMatchObject({ percentPerDecade: 0, estimated: technology === 'aluminium' });
      expect(rate.basis).toContain(technology);
    }
    expect(ageingRate({})).toEqual({ percentPerDecade: 0, estimated: false, basis: 'as given' });
  });

  it('does not count at the reference age', () => {
    const part = { capacitance_F: 1e-6, esr_ohm: 0, esl_H: 0, dielectric: 'X7R' };
    expect(ageingEstimate(part, 1000)).toMatchObject({ factor: 1, estimated: false });
    expect(ageingEstimate(part, 1e4)).toEqual({ factor: 0.975, estimated: true, basis: 'usual rate of X7R' });
  });
});
