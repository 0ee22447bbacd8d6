import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../../../tests/helpers/random-network';
import type { LineModel, RailNetwork } from '../network';
import { compileRail, railImpedance, scratch } from '../rail';
import { formImpedance } from './form-impedance';
import { type PoleForm, poleForm } from './pole-form';

const rl = { kind: 'rl' as const, resistance_ohm: 1e-3, inductance_H: 1e-8 };
const line = (id: string, esr_ohm: number, capacitance_F: number, inductance_H: number): LineModel => ({
  id,
  count: 1,
  esr_ohm,
  capacitance_F,
  inductance_H,
});
const pins = (lines: LineModel[], source: RailNetwork['source'] = rl): RailNetwork => ({
  source,
  lines,
  observe: 'pins',
});

/** Largest difference from the engine between 1 kHz and 1 GHz, relative to |Z|. */
function worstOf(network: RailNetwork, form: PoleForm): number {
  const rail = compileRail(network);
  const z = scratch();
  const out = new Float64Array(2);
  let worst = 0;
  for (let i = 0; i <= 300; i++) {
    const f = 1.01e3 * 1e6 ** (i / 300);
    railImpedance(rail, f, z);
    formImpedance(form, f, out);
    worst = Math.max(worst, Math.hypot(out[0] - z[0], out[1] - z[1]) / Math.hypot(z[0], z[1]));
  }
  return worst;
}
const check = (network: RailNetwork) => {
  const form = poleForm(compileRail(network));
  expect(worstOf(network, form)).toBeLessThan(1e-8);
  return form;
};

describe('the pole form of random rails', () => {
  it('is the engine’s impedance to 1e-8, with all poles on the left', () => {
    fc.assert(
      fc.property(railNetwork, (network) => {
        const form = check(network);
        for (const re of form.poleRe) expect(re).toBeLessThan(0);
        for (const im of form.poleIm) expect(im).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 1000, seed: 41 },
    );
  });
});

describe('the pole form of awkward rails', () => {
  it('holds where two poles coincide: critical damping, near it and right at it', () => {
    // (R1 + L) ∥ (R2 + C) is critically damped at R1 + R2 = 2·√(L/C).
    for (const away of [1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 0, -1e-9, -1e-7, -1e-5, -1e-3])
      check(pins([line('c', (2e-2 - 1e-3) * (1 + away), 1e-4, 0)]));
  });

  it('holds for two dozen parts that are equal but for a little, down to nothing', () => {
    for (const spread of [1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 0]) {
      const lines = Array.from({ length: 24 }, (_, i) =>
        line(`${i}`, 5e-3, 1e-6, 1e-9 * (1 + spread * Math.sin(7 * i + 1))),
      );
      check(pins(lines));
    }
  });

  it('holds where a pole and a zero cancel: a source and a bank of one time constant', () => {
    const source = { kind: 'rl' as const, resistance_ohm: 1e-2, inductance_H: 1e-8 };
    for (const away of [0, 1e-14, 1e-11, 1e-7]) {
      const form = check(pins([line('c', 1e-2 * (1 + away), 1e-4, 0)], source));
      expect(form.dc_ohm).toBe(1e-2);
    }
  });

  it('holds for sixty lines over nine decades of capacitance', () => {
    const lines = Array.from({ length: 60 }, (_, i) =>
      line(`${i}`, 2e-3 + 1e-3 * i, 1e-3 / 1.4 ** i, 3e-9 / 1.03 ** i),
    );
    expect(check(pins(lines)).poleRe.length).toBeGreaterThan(50);
  });

  it('has no poles for a source alone', () => {
    const form = check(pins([]));
    expect([form.poleRe.length, form.inductance_H, form.resistance_ohm]).toEqual([0, 1e-8, 1e-3]);
  });

  it('takes a source without resistance', () => {
    const form = check(pins([line('c', 5e-3, 1e-6, 1e-9)], { ...rl, resistance_ohm: 0 }));
    expect(form.dc_ohm).toBe(0);
  });

  it('leaves out lines of count 0', () => {
    const lines = [line('c', 5e-3, 1e-6, 1e-9)];
    const more = [...lines, { ...line('d', 1e-3, 1e-5, 1e-9), count: 0 }];
    expect(poleForm(compileRail(pins(more)))).toEqual(poleForm(compileRail(pins(lines))));
  });
});

describe('what has no pole form', () => {
  const refused = (network: RailNetwork, field: string, words: RegExp) => {
    const make = () => poleForm(compileRail(network));
    expect(make).toThrow(words);
    expect(make).toThrow(expect.objectContaining({ name: 'EngineError', field }));
  };

  it('is a rail with an open source', () => {
    refused(pins([line('c', 5e-3, 1e-6, 1e-9)], { kind: 'open' }), 'source', /never settles/);
  });

  it('is a rail without losses', () => {
    refused(
      pins([line('c', 0, 1e-6, 1e-9)], { ...rl, resistance_ohm: 0 }),
      'network',
      /ring without end: give it resistance/,
    );
  });
});
