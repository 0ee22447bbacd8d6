import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compileRail, railImpedance } from '../rail';
import { poleForm } from './pole-form';
import { quasiStaticAbove } from './quasi-static';
import { worstPattern } from './worst-pattern';

/** A bank whose plane pair rings at about 900 MHz, far above its band of 30 MHz. */
const rail = (scale = 1) =>
  compileRail({
    source: { kind: 'rl', resistance_ohm: 2e-3, inductance_H: 4e-8 },
    plane: { capacitance_F: 2.4e-10, resistance_ohm: 1e-3, inductance_H: 8e-12 },
    lines: [
      { id: 'bulk', count: 1, esr_ohm: 9e-3, capacitance_F: 2.2e-4 * scale, inductance_H: 3e-9 },
      { id: 'mid', count: 4, esr_ohm: 4e-3, capacitance_F: 7e-6 * scale, inductance_H: 1.5e-9 },
      { id: 'small', count: 7, esr_ohm: 9e-3, capacitance_F: 9e-7 * scale, inductance_H: 1.2e-9 },
    ],
    observe: 'pins',
  });

describe('a rail without its resonances far above the band', () => {
  const out = new Float64Array(4);
  const z = (form: ReturnType<typeof poleForm>, f: number): [number, number] => {
    const w = 2 * Math.PI * f;
    let re = form.resistance_ohm;
    let im = w * form.inductance_H;
    for (let i = 0; i < form.poleRe.length; i++)
      for (const sign of form.poleIm[i] === 0 ? [1] : [1, -1]) {
        const [dr, di] = [-form.poleRe[i], w - sign * form.poleIm[i]];
        const [rr, ri] = [form.residueRe[i], sign * form.residueIm[i]];
        const d2 = dr * dr + di * di;
        re += (rr * dr + ri * di) / d2;
        im += (ri * dr - rr * di) / d2;
      }
    return [re, im];
  };

  it('has the same impedance in its band and the same at 0 Hz', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.3, max: 3, noNaN: true }), (scale) => {
        const form = poleForm(rail(scale));
        const still = quasiStaticAbove(form, 3e8);
        expect(still.dc_ohm).toBe(form.dc_ohm);
        expect(still.poleRe.length).toBeLessThan(form.poleRe.length);
        for (const f of [1e3, 1e5, 3e6, 3e7]) {
          railImpedance(rail(scale), f, out);
          const [re, im] = z(still, f);
          expect(Math.hypot(re - out[0], im - out[1]) / Math.hypot(out[0], out[1])).toBeLessThan(3e-3);
        }
        const [dc] = z(still, 1e-6);
        expect(dc / form.dc_ohm).toBeCloseTo(1, 6);
      }),
      { numRuns: 30, seed: 8 },
    );
  });

  it('keeps everything below the limit, so that nothing changes where nothing is above', () => {
    const form = poleForm(rail());
    expect(quasiStaticAbove(form, 1e12)).toEqual(form);
    expect(() => quasiStaticAbove(form, 0)).toThrow(expect.objectContaining({ field: 'band_Hz' }));
  });

  it('has no worst pattern that plays on a ring beyond the band', () => {
    const form = poleForm(rail());
    const load = { step_A: 3, rise_s: 1.2e-8 };
    const whole = worstPattern(form, load).fall.bound_V;
    const inBand = worstPattern(quasiStaticAbove(form, 3e8), load).fall.bound_V;
    expect(whole).toBeGreaterThan(10 * inBand);
    expect(inBand).toBeGreaterThan(0.03);
  });
});
