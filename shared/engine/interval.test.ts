import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { intervalBound } from './interval';
import type { RailNetwork } from './network';
import { compileRail, impedanceMagnitude } from './rail';

/** A rail with every part's C, ESR and L multiplied by the three factors of its line. */
function rail(factors: readonly (readonly [number, number, number])[], observe: 'pins' | 'die'): RailNetwork {
  const base = [
    { id: 'bulk', count: 2, esr_ohm: 8e-3, capacitance_F: 3.3e-4, inductance_H: 2.5e-9 },
    { id: 'mid', count: 4, esr_ohm: 3e-3, capacitance_F: 2.2e-5, inductance_H: 1.1e-9 },
    { id: 'small', count: 7, esr_ohm: 1.5e-2, capacitance_F: 2.2e-7, inductance_H: 8e-10 },
  ];
  return {
    source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 1.5e-8 },
    plane: { capacitance_F: 3e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
    lines: base.map((line, i) => ({
      ...line,
      capacitance_F: line.capacitance_F * factors[i][0],
      esr_ohm: line.esr_ohm * factors[i][1],
      inductance_H: line.inductance_H * factors[i][2],
    })),
    package: { resistance_ohm: 1e-3, inductance_H: 4e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 4e-3 },
    observe,
  };
}

const all = (c: number, r: number, l: number) => [0, 1, 2].map(() => [c, r, l] as const);
const frequencies = Array.from({ length: 60 }, (_, i) => 1e4 * 1e4 ** (i / 59));
const within = fc.tuple(
  fc.double({ min: 0.6, max: 1.2, noNaN: true }),
  fc.double({ min: 0.7, max: 1.3, noNaN: true }),
  fc.double({ min: 0.85, max: 1.15, noNaN: true }),
);

describe('the bound for parts that differ from each other', () => {
  it.each(['pins', 'die'] as const)('lies above every mixture of parts, seen from the %s', (observe) => {
    const bound = intervalBound(
      compileRail(rail(all(0.6, 0.7, 0.85), observe)),
      compileRail(rail(all(1.2, 1.3, 1.15), observe)),
      frequencies,
    );
    fc.assert(
      fc.property(fc.tuple(within, within, within), (factors) => {
        const one = compileRail(rail(factors, observe));
        frequencies.forEach((f, i) => {
          expect(impedanceMagnitude(one, f)).toBeLessThanOrEqual(bound[i] * (1 + 1e-9));
        });
      }),
      { numRuns: 400, seed: 3 },
    );
  });

  it.each(['pins', 'die'] as const)(
    'is the impedance itself where nothing varies, seen from the %s',
    (observe) => {
      const one = compileRail(rail(all(1, 1, 1), observe));
      intervalBound(one, one, frequencies).forEach((bound, i) => {
        const z = impedanceMagnitude(one, frequencies[i]);
        expect(bound / z).toBeGreaterThanOrEqual(1 - 1e-9);
        expect(bound / z).toBeLessThan(1.003);
      });
    },
  );

  it('is not far above the worst mixture of ends', () => {
    const [low, high] = [all(0.6, 0.7, 0.85), all(1.2, 1.3, 1.15)].map((f) => compileRail(rail(f, 'pins')));
    const bound = intervalBound(low, high, frequencies);
    const ends = [0.6, 1.2].flatMap((c) =>
      [0.7, 1.3].flatMap((r) => [0.85, 1.15].map((l) => [c, r, l] as const)),
    );
    const worst = new Float64Array(frequencies.length);
    for (const a of ends)
      for (const b of ends)
        for (const c of ends) {
          const one = compileRail(rail([a, b, c], 'pins'));
          frequencies.forEach((f, i) => {
            worst[i] = Math.max(worst[i], impedanceMagnitude(one, f));
          });
        }
    // Convex hulls stand in for arcs, and ends for what lies between: some room is the bound's price.
    const excess = worst.map((z, i) => 20 * Math.log10(bound[i] / z));
    expect(Math.max(...excess)).toBeLessThan(7);
    expect(excess.reduce((sum, x) => sum + x, 0) / excess.length).toBeLessThan(0.6);
  });
});
