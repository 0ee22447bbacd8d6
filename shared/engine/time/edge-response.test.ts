import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../../../tests/helpers/random-network';
import { compileRail } from '../rail';
import { edgeResponse } from './edge-response';
import { poleForm } from './pole-form';
import { responseAt } from './response';

/** A source of little loss with one capacitor: Q = ω0·L/(R1 + R2). */
const ringing = (q: number) =>
  poleForm(
    compileRail({
      source: { kind: 'rl', resistance_ohm: 0.25e-2 / q, inductance_H: 1e-8 },
      lines: [{ id: 'c', count: 1, esr_ohm: 0.25e-2 / q, capacitance_F: 4e-4, inductance_H: 0 }],
      observe: 'pins',
    }),
  );

describe('turns and total variation of an edge response', () => {
  it('are where the voltage is what they say, and it goes one way between them, on random rails', () => {
    fc.assert(
      fc.property(railNetwork, fc.constantFrom(1e-9, 3e-8, 1e-6), (network, rise_s) => {
        const form = poleForm(compileRail(network));
        const { turns, variation_ohm } = edgeResponse(form, rise_s);
        const [ended_s, ended_ohm] = turns[turns.length - 1];
        if (!Number.isFinite(ended_s)) expect(ended_ohm).toBeCloseTo(form.dc_ohm, 12);
        expect(variation_ohm).toBeGreaterThanOrEqual(form.dc_ohm * (1 - 1e-12));
        const edge = [
          [0, 0],
          [rise_s, 1],
        ] as const;
        const slowest = Math.max(rise_s, ...form.poleRe.map((re) => -1 / re));
        for (let i = 1; i < Math.min(turns.length, 80); i++) {
          const [from_s, from_ohm] = turns[i - 1];
          const [to_s, to_ohm] = turns[i];
          const end_s = Number.isFinite(to_s) ? to_s : from_s + 5 * slowest;
          const times = Float64Array.from({ length: 21 }, (_, k) => from_s + (end_s - from_s) * (k / 21));
          const fall = responseAt(form, edge, times.subarray(1)).map((v) => -v);
          const slack = 1e-9 * variation_ohm;
          fall.forEach((ohm, k) => {
            const way = Math.sign(to_ohm - from_ohm) * (ohm - (k === 0 ? from_ohm : fall[k - 1]));
            if (end_s > from_s) expect(way).toBeGreaterThan(-slack);
          });
          if (to_s !== rise_s && Number.isFinite(to_s) && to_s > 0)
            expect(Math.abs(responseAt(form, edge, Float64Array.of(to_s))[0] + to_ohm)).toBeLessThan(slack);
        }
      }),
      { numRuns: 120, seed: 43 },
    );
  });

  it('alternate, and hold each turn of a single resonance at its place', () => {
    const { turns } = edgeResponse(ringing(20), 0);
    expect(turns.length).toBeGreaterThan(200);
    for (let i = 2; i < turns.length; i++) {
      expect(turns[i][1] > turns[i - 1][1]).toBe(i % 2 === 1);
      expect(turns[i][0]).toBeGreaterThan(turns[i - 1][0]);
    }
    // Half a period of 2π·√(LC)/√(1 − 1/4Q²) between turns.
    const half_s = (Math.PI * 2e-6) / Math.sqrt(1 - 1 / (4 * 400));
    expect(turns[10][0] - turns[9][0]).toBeCloseTo(half_s, 14);
  });

  it('stay an upper bound, and a close one, where the search runs out of steps', () => {
    for (const q of [30, 300, 3000]) {
      const form = ringing(q);
      const full = edgeResponse(form, 0, 10_000_000).variation_ohm;
      for (const steps of [64, 640, 6400]) {
        const cut = edgeResponse(form, 0, steps).variation_ohm;
        expect(cut).toBeGreaterThanOrEqual(full * (1 - 1e-9));
        expect(cut).toBeLessThan(full * 1.08);
      }
    }
  });

  it('have the jumps of L/rise_s where every path has inductance', () => {
    const form = poleForm(
      compileRail({
        source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 2e-9 },
        lines: [],
        observe: 'pins',
      }),
    );
    // R–L alone: up by L/w at once, on by R, then down by L/w.
    const { turns, variation_ohm } = edgeResponse(form, 1e-6);
    expect(turns.map(([, ohm]) => ohm)).toEqual([0, expect.closeTo(3e-3, 12), expect.closeTo(1e-3, 12)]);
    expect(variation_ohm).toBeCloseTo(3e-3 + 2e-3, 12);
  });
});
