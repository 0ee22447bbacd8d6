import { BankSum, sampleAdmittance } from '@shared/engine/bank-sum';
import { branchAdmittance, lineBranch } from '@shared/engine/branch';
import { sampleRail, sweepCurve } from '@shared/engine/curve';
import { impedanceOver } from '@shared/engine/impedance-over';
import { compileRail, railImpedance, scratch } from '@shared/engine/rail';
import { memberShares, type UnitAdmittance } from '@shared/engine/shares';
import Complex from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { complexImpedance } from '../helpers/complex-model';
import { frequency, railNetwork } from '../helpers/random-network';

/** Against complex.js, an open library of complex numbers, summing the rail's definition branch by branch. */
describe('the engine against an independent complex sum', () => {
  it('agrees to 1e-9 of |Z| on 2000 random rails', () => {
    const out = scratch();
    let worst = 0;
    fc.assert(
      fc.property(railNetwork, frequency, (network, f) => {
        railImpedance(compileRail(network), f, out);
        const expected = complexImpedance(network, f);
        const error = Math.hypot(out[0] - expected.re, out[1] - expected.im) / expected.abs();
        worst = Math.max(worst, error);
        expect(error).toBeLessThan(1e-9);
      }),
      { numRuns: 2000, seed: 11 },
    );
    expect(worst).toBeGreaterThan(0);
  });

  it('agrees over lists of frequencies with its own value at each of them', () => {
    const out = scratch();
    fc.assert(
      fc.property(railNetwork, fc.array(frequency, { minLength: 1, maxLength: 20 }), (network, list) => {
        const rail = compileRail(network);
        const { re_ohm, im_ohm } = impedanceOver(rail, list);
        list.forEach((f, i) => {
          railImpedance(rail, f, out);
          expect(
            Math.hypot(re_ohm[i] - out[0], im_ohm[i] - out[1]) / Math.hypot(out[0], out[1]),
          ).toBeLessThan(1e-11);
        });
      }),
      { numRuns: 500, seed: 14 },
    );
  });

  it('has shares that sum to the whole load current, as complex numbers', () => {
    fc.assert(
      fc.property(railNetwork, frequency, (network, f) => {
        const shares = memberShares(compileRail(network), [f]);
        const sum = shares.reduce((s, one) => s.add(new Complex(one.re[0], one.im[0])), new Complex(0, 0));
        const scale = shares.reduce((s, one) => s + Math.hypot(one.re[0], one.im[0]), 1);
        expect(sum.sub(1).abs() / scale).toBeLessThan(1e-12);
      }),
      { numRuns: 500, seed: 12 },
    );
  });

  it('keeps an incrementally changed bank equal to a new sum, value and derivative', () => {
    const frequency_Hz = Float64Array.from({ length: 50 }, (_, i) => 1e4 * 10 ** (i / 12));
    const units = [1e-4, 1e-6, 1e-8].map((capacitance_F, i) =>
      sampleAdmittance(
        lineBranch({ id: String(i), count: 1, esr_ohm: 0.01, capacitance_F, inductance_H: 1e-9 }, 'line'),
        frequency_Hz,
      ),
    );
    const bank = new BankSum(frequency_Hz, units, [1, 2, 3]);
    const counts = [1, 2, 3];
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 }), fc.integer({ min: 0, max: 50 }), (k, count) => {
        counts[k] = count;
        bank.setCounts(counts);
        const fresh = new BankSum(frequency_Hz, units, counts);
        for (const key of ['g', 'b', 'dg', 'db'] as const)
          bank.total[key].forEach((value, i) => {
            const scale = units.reduce((sum, unit) => sum + 50 * Math.abs(unit[key][i]), 0);
            expect(Math.abs(value - fresh.total[key][i])).toBeLessThan(1e-12 * scale);
          });
      }),
      { numRuns: 1500, seed: 13 },
    );
  });

  it('sweeps and shares from kept samples as from fresh ones', () => {
    fc.assert(
      fc.property(railNetwork, (network) => {
        const rail = compileRail(network);
        const samples = sampleRail(rail, 1e4, 1e8);
        const fresh = sweepCurve(rail, 1e4, 1e8);
        const kept = sweepCurve(rail, 1e4, 1e8, { samples });
        expect(kept.frequency_Hz).toEqual(fresh.frequency_Hz);
        kept.logMagnitude.forEach((value, i) => {
          expect(Math.abs(value - fresh.logMagnitude[i])).toBeLessThan(1e-9);
        });
        const unit: UnitAdmittance = (member, point, out) => {
          const sample = kept.sample[point];
          if (sample < 0) return branchAdmittance(rail.members[member].branch, kept.frequency_Hz[point], out);
          out[0] = samples.units[member].g[sample];
          out[1] = samples.units[member].b[sample];
        };
        const direct = memberShares(rail, kept.frequency_Hz);
        memberShares(rail, kept.frequency_Hz, unit).forEach(({ member, re, im }, k) => {
          expect(member).toBe(direct[k].member);
          re.forEach((value, i) => {
            const scale = 1 + Math.hypot(direct[k].re[i], direct[k].im[i]);
            expect(Math.abs(value - direct[k].re[i]) / scale).toBeLessThan(1e-11);
            expect(Math.abs(im[i] - direct[k].im[i]) / scale).toBeLessThan(1e-11);
          });
        });
      }),
      { numRuns: 60, seed: 15 },
    );
  });
});
