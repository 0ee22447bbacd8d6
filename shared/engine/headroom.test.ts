import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { holds, surfaceMaxima, tightestHeadroom } from './headroom';
import { compileRail, impedanceMagnitude } from './rail';
import { flatTarget, maskTarget, targetAt } from './target';

const resistor = (resistance_ohm: number) =>
  compileRail({ source: { kind: 'rl', resistance_ohm, inductance_H: 0 }, lines: [], observe: 'pins' });

describe('the tightest headroom of a level impedance', () => {
  it('is found where the mask is lowest, though nothing peaks there', () => {
    const mask = maskTarget([
      [1e4, 0.02],
      [1e6, 0.005],
    ]);
    const tightest = tightestHeadroom(resistor(0.01), [1e4, 1e7], mask);
    expect(tightest.headroom_dB).toBeCloseTo(-20 * Math.log10(2), 9);
    expect(holds(tightest)).toBe(false);
    const mirrored = maskTarget([
      [1e5, 0.005],
      [1e7, 0.02],
    ]);
    expect(tightestHeadroom(resistor(0.01), [1e4, 1e7], mirrored).headroom_dB).toBeCloseTo(
      -20 * Math.log10(2),
      9,
    );
  });

  it('is never better than at any point of the band, for any mask', () => {
    const level = fc.double({ min: Math.log(1e-3), max: Math.log(1), noNaN: true }).map(Math.exp);
    // Some neighbours alike, so that masks have level stretches.
    const corners = fc.array(fc.tuple(level, fc.boolean()), { minLength: 1, maxLength: 6 });
    fc.assert(
      fc.property(corners, level, fc.boolean(), (steps, r, hasInductance) => {
        let z = steps[0][0];
        const points = steps.map(([next, same], i): [number, number] => {
          if (!same) z = next;
          return [1e4 * 10 ** (i * 0.7), z];
        });
        const mask = maskTarget(points);
        const rail = compileRail({
          source: { kind: 'rl', resistance_ohm: r, inductance_H: hasInductance ? 1e-9 : 0 },
          lines: [],
          observe: 'pins',
        });
        const tightest = tightestHeadroom(rail, [1e4, 1e8], mask);
        for (let i = 0; i <= 400; i++) {
          const f = 1e4 * 10 ** (i / 100);
          const here = 20 * Math.log10(targetAt(mask, f) / impedanceMagnitude(rail, f));
          expect(tightest.headroom_dB).toBeLessThanOrEqual(here + 1e-7);
        }
      }),
      { numRuns: 400, seed: 41 },
    );
  });

  it('names a corner that breaks the surface once', () => {
    const mask = maskTarget([
      [1e4, 4e-3],
      [1e6, 4e-3],
      [1e7, 1.2e-2],
      [4e7, 4.8e-2],
    ]);
    const rail = compileRail({
      source: { kind: 'rl', resistance_ohm: 6e-3, inductance_H: 1e-11 },
      lines: [],
      observe: 'pins',
    });
    const places = surfaceMaxima(rail, [1e4, 4e7], mask).map((one) => Math.round(one.frequency_Hz));
    expect(new Set(places).size).toBe(places.length);
    expect(places).toContain(1e6);
  });

  it('is at the start of the band where the ratio is level throughout', () => {
    expect(tightestHeadroom(resistor(0.01), [1e4, 1e7], flatTarget(0.02)).headroom_dB).toBeCloseTo(
      20 * Math.log10(2),
      12,
    );
  });
});
