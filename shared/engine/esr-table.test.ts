import Complex from 'complex.js';
import { describe, expect, it } from 'vitest';
import { branchAdmittance, lineBranch } from './branch';
import { sweepCurve } from './curve';
import { esrAt, prepareEsr } from './esr-table';
import { impedanceOver } from './impedance-over';
import type { LineModel } from './network';
import { compileRail, impedanceMagnitude } from './rail';

const esr_table = {
  frequency_Hz: Float64Array.from([1e4, 1e5, 1e6, 1e7]),
  resistance_ohm: Float64Array.from([0.05, 0.02, 0.006, 0.009]),
};
const line: LineModel = {
  id: 'C',
  count: 2,
  esr_ohm: 0.006,
  capacitance_F: 4.7e-4,
  inductance_H: 2.5e-9,
  esr_table,
};
const out = new Float64Array(4);

describe('ESR over frequency', () => {
  it('passes through its points, straight on log–log paper between them, level beyond', () => {
    const table = prepareEsr(esr_table, 'esr');
    esr_table.frequency_Hz.forEach((f, i) => {
      esrAt(table, f, out);
      expect(out[0]).toBeCloseTo(esr_table.resistance_ohm[i], 12);
    });
    esrAt(table, Math.sqrt(1e4 * 1e5), out);
    expect(out[0]).toBeCloseTo(Math.sqrt(0.05 * 0.02), 12);
    esrAt(table, 10, out);
    expect([out[0], out[1]]).toEqual([expect.closeTo(0.05, 12), 0]);
    esrAt(table, 1e9, out);
    expect([out[0], out[1]]).toEqual([expect.closeTo(0.009, 12), 0]);
  });

  it('makes the branch R(f) + jX, with its exact derivative', () => {
    const branch = lineBranch(line, 'line');
    const table = prepareEsr(esr_table, 'esr');
    for (const f of [3e3, 2e4, 3.3e5, 2e6, 4e7]) {
      esrAt(table, f, out);
      const w = 2 * Math.PI * f;
      const y = new Complex(out[0], w * 2.5e-9 - 1 / (w * 4.7e-4)).inverse();
      branchAdmittance(branch, f, out);
      expect(out[0] / y.re).toBeCloseTo(1, 10);
      expect(out[1] / y.im).toBeCloseTo(1, 10);
      const h = 1e-6;
      const [dg, db] = [out[2], out[3]];
      branchAdmittance(branch, f * Math.exp(h), out);
      const [g1, b1] = [out[0], out[1]];
      branchAdmittance(branch, f * Math.exp(-h), out);
      const scale = Math.hypot(g1, b1);
      expect((g1 - out[0]) / (2 * h) / scale).toBeCloseTo(dg / scale, 6);
      expect((b1 - out[1]) / (2 * h) / scale).toBeCloseTo(db / scale, 6);
    }
  });

  it('is the same at one frequency and over a list, and has its knots among a sweep’s points', () => {
    const rail = compileRail({ source: { kind: 'open' }, lines: [line], observe: 'pins' });
    const frequencies = [2e3, 5e4, 1e6, 3e7];
    const { re_ohm, im_ohm } = impedanceOver(rail, frequencies);
    frequencies.forEach((f, i) => {
      expect(Math.hypot(re_ohm[i], im_ohm[i]) / impedanceMagnitude(rail, f)).toBeCloseTo(1, 12);
    });
    const swept = Array.from(sweepCurve(rail, 1e3, 1e8).frequency_Hz);
    for (const knot of esr_table.frequency_Hz)
      expect(swept.some((f) => Math.abs(f / knot - 1) < 1e-12)).toBe(true);
  });

  it.each([
    ['one point', [1e4], [0.1], 'esr'],
    ['frequencies that do not rise', [1e4, 1e4], [0.1, 0.2], 'esr[1]'],
    ['an ESR of nothing', [1e4, 1e5], [0.1, 0], 'esr[1]'],
    ['a frequency that is none', [Number.NaN, 1e5], [0.1, 0.1], 'esr[0]'],
  ])('refuses %s', (_, f, r, field) => {
    const table = { frequency_Hz: Float64Array.from(f), resistance_ohm: Float64Array.from(r) };
    expect(() => prepareEsr(table, 'esr')).toThrow(expect.objectContaining({ field }));
  });
});

describe('a measured table with what has changed since', () => {
  it('is rScale·Re + j(Im + ωl − d/ω) of the table', () => {
    const points = [1e4, 1e5, 1e6, 1e7];
    const table = {
      frequency_Hz: Float64Array.from(points),
      re_ohm: Float64Array.from([0.02, 0.015, 0.01, 0.02]),
      im_ohm: Float64Array.from([-16, -1.6, -0.15, 0.05]),
    };
    const branch = lineBranch(
      {
        ...line,
        esr_table: undefined,
        table,
        added_inductance_H: 1e-9,
        added_elastance_perF: 4e5,
        resistance_factor: 1.3,
      },
      'line',
    );
    points.forEach((f, i) => {
      const w = 2 * Math.PI * f;
      const z = new Complex(1.3 * table.re_ohm[i], table.im_ohm[i] + w * 1e-9 - 4e5 / w);
      branchAdmittance(branch, f, out);
      expect(out[0] / z.inverse().re).toBeCloseTo(1, 10);
      expect(out[1] / z.inverse().im).toBeCloseTo(1, 10);
    });
  });
});
