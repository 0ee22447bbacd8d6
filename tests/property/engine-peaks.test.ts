import { sweepCurve } from '@shared/engine/curve';
import { surfaceMaxima, tightestHeadroom } from '@shared/engine/headroom';
import { findPeaks } from '@shared/engine/peaks';
import { compileRail, impedanceMagnitude, scratch } from '@shared/engine/rail';
import { maskTarget, targetAt } from '@shared/engine/target';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../helpers/random-network';

const LOW = 1e4;
const HIGH = 1e8;
const DENSE = Array.from({ length: 6001 }, (_, i) => LOW * (HIGH / LOW) ** (i / 6000));

describe('peaks of random rails', () => {
  it('are no lower than what 6000 dense points show, and every dense local maximum is among them', () => {
    const out = scratch();
    fc.assert(
      fc.property(railNetwork, (network) => {
        const rail = compileRail(network);
        const z = DENSE.map((f) => impedanceMagnitude(rail, f, out));
        const peaks = findPeaks(rail, LOW, HIGH);
        for (let i = 1; i + 1 < z.length; i++) {
          const stands = z[i] > z[i - 1] && z[i] > z[i + 1] && z[i] / Math.min(z[i - 1], z[i + 1]) - 1 > 1e-8;
          if (!stands) continue;
          const near = peaks.find((p) => p.frequency_Hz >= DENSE[i - 1] && p.frequency_Hz <= DENSE[i + 1]);
          expect(near, `peak near ${DENSE[i]} Hz`).toBeDefined();
          expect(near?.impedance_ohm).toBeGreaterThanOrEqual(z[i] * (1 - 1e-12));
        }
      }),
      { numRuns: 250, seed: 31 },
    );
  });

  it('are true maxima: a step of 1e-5 to either side is lower', () => {
    fc.assert(
      fc.property(railNetwork, (network) => {
        const rail = compileRail(network);
        for (const { frequency_Hz: f, impedance_ohm, edge } of findPeaks(rail, LOW, HIGH)) {
          const sides = [edge === 'low' ? null : f * (1 - 1e-5), edge === 'high' ? null : f * (1 + 1e-5)];
          for (const side of sides)
            if (side !== null)
              expect(impedanceMagnitude(rail, side)).toBeLessThanOrEqual(impedance_ohm * (1 + 1e-12));
        }
      }),
      { numRuns: 250, seed: 32 },
    );
  });

  it('make the tightest headroom, over masks too, no better than dense points find it', () => {
    const mask = maskTarget([
      [1e4, 5e-3],
      [1e6, 5e-3],
      [5e7, 0.2],
    ]);
    fc.assert(
      fc.property(railNetwork, (network) => {
        const rail = compileRail(network);
        const tightest = tightestHeadroom(rail, [LOW, HIGH], mask);
        const dense = Math.min(
          ...DENSE.map((f) => 20 * Math.log10(targetAt(mask, f) / impedanceMagnitude(rail, f))),
        );
        expect(tightest.headroom_dB).toBeLessThanOrEqual(dense + 1e-9);
        expect(tightest.headroom_dB).toBeGreaterThan(dense - 1.5);
        const all = surfaceMaxima(rail, [LOW, HIGH], mask).map((m) => m.headroom_dB);
        expect(Math.min(...all)).toBeCloseTo(tightest.headroom_dB, 9);
      }),
      { numRuns: 150, seed: 33 },
    );
  });
});

describe('the sweep for drawing', () => {
  it('has 60 points a decade and more, and is off a straight line between points by no more than it should', () => {
    const out = scratch();
    fc.assert(
      fc.property(railNetwork, (network) => {
        const rail = compileRail(network);
        const { frequency_Hz: f, logMagnitude } = sweepCurve(rail, LOW, HIGH);
        expect(f.length).toBeGreaterThanOrEqual(240);
        for (let i = 1; i < f.length; i++) expect(f[i]).toBeGreaterThan(f[i - 1]);
        // No peak cut by more than 0.01 dB once the exact peaks are put among the points.
        for (const peak of findPeaks(rail, LOW, HIGH)) {
          const i = f.findIndex((one) => one >= peak.frequency_Hz);
          const best = Math.max(logMagnitude[i], logMagnitude[Math.max(0, i - 1)]);
          expect(20 * Math.log10(peak.impedance_ohm / Math.exp(best))).toBeLessThan(0.5);
        }
        expect(impedanceMagnitude(rail, f[7], out)).toBeCloseTo(Math.exp(logMagnitude[7]), 9);
      }),
      { numRuns: 60, seed: 34 },
    );
  });
});
