import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../../../tests/helpers/random-network';
import type { RailNetwork } from '../network';
import { compileRail } from '../rail';
import type { LoadCurrent } from './load-current';
import { poleForm } from './pole-form';
import { responseAt } from './response';

const network: RailNetwork = {
  source: { kind: 'rl', resistance_ohm: 2e-3, inductance_H: 1e-8 },
  lines: [{ id: 'c', count: 1, esr_ohm: 2e-3, capacitance_F: 1e-4, inductance_H: 0 }],
  observe: 'pins',
};
const form = poleForm(compileRail(network));
const withInductance = poleForm(
  compileRail({ ...network, lines: [{ ...network.lines[0], inductance_H: 1e-9 }] }),
);
const trapezoid: LoadCurrent = [
  [0, 1],
  [1e-6, 3],
  [4e-6, 3],
  [9e-6, 0.5],
];

describe('the voltage under a load current', () => {
  it('is the closed form after a jump: v = R1 + e^{−αt}(A cos ωt + B sin ωt)', () => {
    const alpha = 2e5;
    const wd = Math.sqrt(1e12 - alpha * alpha);
    const b = (1e4 - 2e-3 * 2e-3 * 1e8) / wd;
    const times = Float64Array.from({ length: 50 }, (_, i) => i * 3.7e-7);
    const jump: LoadCurrent = [
      [0, 0],
      [0, 1],
    ];
    responseAt(form, jump, times).forEach((v, i) => {
      const t = times[i];
      expect(-v).toBeCloseTo(2e-3 + Math.exp(-alpha * t) * b * Math.sin(wd * t), 14);
    });
  });

  it('is the same in equal steps as at each time alone', () => {
    const times = Float64Array.from({ length: 4001 }, (_, i) => -1e-6 + i * 5e-9);
    const all = responseAt(withInductance, trapezoid, times);
    for (const i of [0, 7, 200, 201, 333, 400, 1000, 1002, 2000, 3999, 4000])
      expect(responseAt(withInductance, trapezoid, times.subarray(i, i + 1))[0]).toBeCloseTo(all[i], 14);
  });

  it('adds up: two loads together do what each does alone', () => {
    const times = Float64Array.from({ length: 100 }, (_, i) => 1.3e-7 * i ** 1.2);
    const other = trapezoid.map(([t, i]) => [t, i * i] as const);
    const both = trapezoid.map(([t, i]) => [t, i + i * i] as const);
    const [a, b, sum] = [trapezoid, other, both].map((load) => responseAt(form, load, times));
    // Squares are not straight between the corners, but the corners are all that counts.
    sum.forEach((v, i) => {
      expect(v).toBeCloseTo(a[i] + b[i], 14);
    });
  });

  it('jumps by L·di/dt where every path has inductance, and shows the value after the jump', () => {
    const [before, at] = responseAt(withInductance, trapezoid, Float64Array.of(-1e-15, 0));
    expect(before).toBeCloseTo(-2e-3, 14);
    const inductance_H = 1 / (1 / 1e-8 + 1 / 1e-9);
    expect(at - before).toBeCloseTo(-inductance_H * 2e6, 12);
  });

  it('settles at I·Z(0) on random rails', () => {
    fc.assert(
      fc.property(railNetwork, (random) => {
        const one = poleForm(compileRail(random));
        const slowest = Math.max(1e-9, ...one.poleRe.map((re) => -1 / re));
        const load: LoadCurrent = [
          [0, 0],
          [1e-7, 2],
        ];
        const [v] = responseAt(one, load, Float64Array.of(1e-7 + 60 * slowest));
        expect(Math.abs(v + 2 * one.dc_ohm)).toBeLessThan(1e-12);
      }),
      { numRuns: 300, seed: 42 },
    );
  });

  it('refuses a load or times that make no sense', () => {
    const refuse = (load: LoadCurrent, times: number[], field: string) =>
      expect(() => responseAt(withInductance, load, Float64Array.from(times))).toThrow(
        expect.objectContaining({ name: 'EngineError', field }),
      );
    refuse([], [0], 'load');
    refuse([[0, Number.NaN]], [0], 'load[0]');
    refuse(
      [
        [1, 0],
        [0, 1],
      ],
      [0],
      'load[1]',
    );
    refuse(
      [
        [0, 0],
        [0, 1],
      ],
      [0],
      'load[1]',
    );
    refuse(trapezoid, [1, 0], 'time_s');
    refuse(trapezoid, [Number.POSITIVE_INFINITY], 'time_s');
  });
});
