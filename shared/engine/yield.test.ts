import { describe, expect, it } from 'vitest';
import { squaredCorrelation } from './correlation';
import { tightestHeadroom } from './headroom';
import type { RailNetwork } from './network';
import { type CompiledRail, compileRail } from './rail';
import { flatTarget } from './target';
import { wilsonInterval } from './wilson';
import { type LineSpread, runYield, type YieldResult } from './yield';
import { withFactors } from './yield-draw';

const even: readonly [number, number] = [1, 1];

function run(
  rail: CompiledRail,
  spreads: LineSpread[],
  band: [number, number],
  ohm: number,
  options: { draws: number; seed: number },
): YieldResult {
  const steps = runYield(rail, spreads, band, flatTarget(ohm), options);
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

/** One capacitor with no source: below its resonance |Z| falls with f, so the band's lower edge alone decides. */
const oneLine: RailNetwork = {
  source: { kind: 'open' },
  lines: [{ id: 'C', count: 1, esr_ohm: 1e-3, capacitance_F: 1e-6, inductance_H: 1e-10 }],
  observe: 'pins',
};

describe('yield over tolerance', () => {
  it('meets the closed form of a one-line rail within its own interval', () => {
    const rail = compileRail(oneLine);
    const band: [number, number] = [1e4, 1e5];
    const spread = { member: 0, capacitance: [0.8, 1.2] as const, esr: even, esl: even, esl_H: 1e-10 };
    // |Z|(10 kHz) ≤ z ⇔ 1/(ωC) ≤ √(z² − R²) + ωL: solved for C, P = (1.2 − k)/0.4 for an even draw of k in [0.8, 1.2]
    for (const k of [0.83, 0.9, 1, 1.13]) {
      const w = 2 * Math.PI * 1e4;
      const z = Math.hypot(1e-3, 1 / (w * k * 1e-6) - w * 1e-10);
      const result = run(rail, [spread], band, z, { draws: 10_000, seed: 7 });
      const p = (1.2 - k) / 0.4;
      expect(result.low).toBeLessThan(p);
      expect(result.high).toBeGreaterThan(p);
      expect(Math.abs(result.yield - p)).toBeLessThan(3.5 * Math.sqrt((p * (1 - p)) / 10_000));
      expect(result.influence).toEqual([{ member: 0, value: 'capacitance', share: expect.any(Number) }]);
      expect(result.influence[0].share).toBeGreaterThan(0.98);
    }
  });

  const network: RailNetwork = {
    source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
    plane: { capacitance_F: 2e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
    lines: [
      { id: 'bulk', count: 3, esr_ohm: 6e-3, capacitance_F: 4.7e-4, inductance_H: 2.5e-9 },
      { id: 'mid', count: 5, esr_ohm: 4e-3, capacitance_F: 2.2e-5, inductance_H: 1e-9 },
      { id: 'small', count: 9, esr_ohm: 2e-2, capacitance_F: 2.2e-7, inductance_H: 7e-10 },
    ],
    package: { resistance_ohm: 8e-4, inductance_H: 2e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 2e-3 },
    observe: 'die',
  };
  const spreadsOf = (rail: CompiledRail): LineSpread[] =>
    rail.members.flatMap((member, k) =>
      member.role === 'line'
        ? [
            {
              member: k,
              capacitance: [0.8, 1.2] as const,
              esr: [0.7, 1.3] as const,
              esl: [0.8, 1.2] as const,
              esl_H: 4e-10,
            },
          ]
        : [],
    );

  it.each(['pins', 'die'] as const)(
    'finds each draw’s tightest place as the exact search does, at the %s',
    (observe) => {
      const rail = compileRail({ ...network, observe });
      const target = flatTarget(0.02);
      const spreads = spreadsOf(rail);
      const fixed = [0.83, 1.21, 1.17];
      const pinned = spreads.map((spread) => ({
        ...spread,
        capacitance: [fixed[0], fixed[0]] as const,
        esr: [fixed[1], fixed[1]] as const,
        esl: [fixed[2], fixed[2]] as const,
      }));
      const result = run(rail, pinned, [1e4, 1e8], 0.02, { draws: 2, seed: 1 });
      const exact = compileRail({ ...network, observe });
      for (const { member } of spreads)
        exact.members[member].branch = withFactors(
          exact.members[member].branch,
          fixed[0],
          fixed[1],
          (fixed[2] - 1) * 4e-10,
        );
      const { headroom_dB } = tightestHeadroom(exact, [1e4, 1e8], target);
      expect(result.headroom_dB[0]).toBeCloseTo(headroom_dB, 3);
    },
  );

  it('is the same for the same seed and another for another, and tells how far it is', () => {
    const rail = compileRail(network);
    const spreads = spreadsOf(rail);
    const options = { draws: 400, seed: 11 };
    const first = run(rail, spreads, [1e4, 1e8], 0.02, options);
    expect(run(rail, spreads, [1e4, 1e8], 0.02, options)).toEqual(first);
    const other = run(rail, spreads, [1e4, 1e8], 0.02, { ...options, seed: 12 });
    expect(other.headroom_dB).not.toEqual(first.headroom_dB);
    const steps = [...runYield(rail, spreads, [1e4, 1e8], flatTarget(0.02), { ...options, chunk: 100 })];
    expect(steps.map((step) => step.done)).toEqual([100, 200, 300]);
    expect(first.headroom_dB.every((v, i, all) => i === 0 || v >= all[i - 1])).toBe(true);
    expect(first.influence.length).toBe(9);
    expect(first.influence.every((one, i, all) => i === 0 || one.share <= all[i - 1].share)).toBe(true);
  });

  it('refuses ranges and numbers that mean nothing, naming them', () => {
    const rail = compileRail(network);
    const spread = spreadsOf(rail)[0];
    const bad = { ...spread, esr: [0, 1] as const };
    expect(() => run(rail, [bad], [1e4, 1e8], 1, { draws: 10, seed: 1 })).toThrow(
      expect.objectContaining({ field: expect.stringContaining('esr') }),
    );
    expect(() => run(rail, [spread], [1e4, 1e8], 1, { draws: 0, seed: 1 })).toThrow(
      expect.objectContaining({ field: 'draws' }),
    );
  });
});

describe('the interval of a proportion', () => {
  it('is Wilson’s', () => {
    // Newcombe, Statistics in Medicine 17 (1998) 857–872, table I, method 3 (score): 81 of 263 → 0.2553 to 0.3662 (from memory).
    const { low, high } = wilsonInterval(81, 263);
    expect(low).toBeCloseTo(0.2553, 4);
    expect(high).toBeCloseTo(0.3662, 4);
    // 0 of 10: from the formula, z²/(n + z²)
    expect(wilsonInterval(0, 10).low).toBe(0);
    expect(wilsonInterval(0, 10).high).toBeCloseTo(3.841459 / 13.841459, 6);
    expect(() => wilsonInterval(3, 2)).toThrow(expect.objectContaining({ field: 'draws' }));
  });

  it('knows what goes together and what does not', () => {
    const x = Float64Array.from([1, 2, 3, 4]);
    expect(squaredCorrelation(x, Float64Array.from([-2, -4, -6, -8]))).toBeCloseTo(1, 12);
    expect(squaredCorrelation(x, Float64Array.from([1, -1, -1, 1]))).toBeCloseTo(0, 12);
    expect(squaredCorrelation(x, new Float64Array(4))).toBe(0);
  });
});
