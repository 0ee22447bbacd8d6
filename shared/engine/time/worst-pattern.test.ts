import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../../../tests/helpers/random-network';
import type { LineModel, RailNetwork } from '../network';
import { compileRail } from '../rail';
import type { PatternRun } from './pattern-run';
import { poleForm } from './pole-form';
import { responseAt } from './response';
import { worstPattern } from './worst-pattern';

const line = (
  id: string,
  count: number,
  esr_ohm: number,
  capacitance_F: number,
  inductance_H: number,
): LineModel => ({
  id,
  count,
  esr_ohm,
  capacitance_F,
  inductance_H,
});
const rl = { kind: 'rl' as const, resistance_ohm: 5e-4, inductance_H: 2e-8 };
const bank = [
  line('bulk', 2, 6e-3, 470e-6, 2.6e-9),
  line('mid', 3, 3.5e-3, 22e-6, 1.1e-9),
  line('small', 7, 0.02, 100e-9, 0.7e-9),
];
const pack = { resistance_ohm: 8e-4, inductance_H: 2e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 2e-3 };
const rails: Record<string, RailNetwork> = {
  'one resonance': { source: rl, lines: [line('c', 1, 1e-3, 1e-4, 0)], observe: 'pins' },
  'three lines, inductance everywhere': { source: rl, lines: bank, observe: 'pins' },
  'package and die': { source: rl, lines: bank, package: pack, observe: 'die' },
};
const formOf = (network: RailNetwork) => poleForm(compileRail(network));
const reaches = (run: PatternRun, share: number) => {
  expect(run.simulated_V).toBeLessThanOrEqual(run.bound_V * (1 + 1e-9));
  expect(run.simulated_V).toBeGreaterThanOrEqual(share * run.bound_V);
};

/** A seeded sequence between 0 and 1 (a linear congruence, Numerical Recipes). */
function sequence(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

describe('the worst pattern', () => {
  it('reaches 99.8 % of its bound in both directions, by its own simulation', () => {
    for (const network of Object.values(rails))
      for (const rise_s of [1e-9, 1e-7, 1e-5]) {
        const { fall, rise } = worstPattern(formOf(network), { step_A: 3, rise_s });
        reaches(fall, 0.998);
        reaches(rise, 0.998);
      }
  });

  it('reaches 98 % on random rails, where the rise is not next to nothing', () => {
    fc.assert(
      fc.property(railNetwork, fc.constantFrom(1e-9, 1e-7), (network, rise_s) => {
        const { fall, rise, dominant } = worstPattern(formOf(network), { step_A: 1, rise_s });
        // Above Q = 500 more swings would be needed than a pattern may have.
        const share = (dominant?.q ?? 0) < 500 ? 0.98 : 0;
        reaches(fall, share);
        reaches(rise, rise.bound_V > 1e-3 * fall.bound_V ? share : 0);
      }),
      { numRuns: 100, seed: 46 },
    );
  });

  it('is a load between 0 and the step with edges no steeper than the rise time allows', () => {
    const { fall, rise } = worstPattern(formOf(rails['package and die']), { step_A: 3, rise_s: 1e-8 });
    for (const { corners } of [fall, rise])
      corners.forEach(([t, i], k) => {
        expect(i).toBeGreaterThanOrEqual(0);
        expect(i).toBeLessThanOrEqual(3);
        if (k === 0) return;
        const [earlier, before] = corners[k - 1];
        expect(Math.abs(i - before)).toBeLessThanOrEqual((3 * (t - earlier) * (1 + 1e-6)) / 1e-8 + 1e-9);
      });
  });

  it('gives the voltage of that load, with its extreme among the points', () => {
    const form = formOf(rails['three lines, inductance everywhere']);
    const { fall } = worstPattern(form, { step_A: 3, rise_s: 1e-8 });
    const { corners, time_s, deviation_V, simulated_V, simulated_time_s } = fall;
    const exact = responseAt(form, corners, time_s);
    deviation_V.forEach((v, i) => {
      if (i > 0) expect(time_s[i]).toBeGreaterThan(time_s[i - 1]);
      // At a corner the voltage jumps: the points show it before, the response after.
      if (!corners.some(([t]) => Math.abs(t - time_s[i]) < 1e-15)) expect(v).toBeCloseTo(exact[i], 9);
    });
    expect(deviation_V[time_s.indexOf(simulated_time_s)]).toBeCloseTo(-simulated_V, 12);
    // The notch that catches a jump has a width, so the lowest point may lie a little beside.
    expect(-Math.min(...deviation_V)).toBeCloseTo(simulated_V, 6);
  });

  for (const [name, network] of Object.entries(rails))
    it(`has a bound that none of 10 000 other patterns passes: ${name}`, () => {
      const form = formOf(network);
      const rise_s = 2e-8;
      const { fall, rise } = worstPattern(form, { step_A: 1, rise_s });
      // On a grid the response to any switching is a sum of one edge's responses.
      const STEPS = 30_000;
      const step_s = Math.max(fall.simulated_time_s, rise.simulated_time_s) / (0.7 * STEPS);
      const edge = [
        [0, 0],
        [rise_s, 1],
      ] as const;
      const grid = Float64Array.from({ length: STEPS + 1 }, (_, i) => i * step_s);
      const g = responseAt(form, edge, grid).map((v) => -v);
      const random = sequence(47);
      let lowest = 0;
      let highest = 0;
      for (let pattern = 0; pattern < 10_000; pattern++) {
        // Half of them are the worst ones with their edges shaken, so that they come near.
        const near = [fall, rise][pattern % 4];
        const shake = random() ** 3 * 0.1 * STEPS;
        const edges = (
          near
            ? near.edges.map(([t]) => t / step_s + shake * (random() - 0.5))
            : Array.from({ length: 1 + Math.floor(30 * random()) }, () => STEPS * random() ** 2)
        )
          .map((t) => Math.max(0, Math.round(t)))
          .sort((a, b) => a - b);
        for (let look = 0; look < 8; look++) {
          const end =
            look === 0
              ? edges[edges.length - 1]
              : Math.round(edges[edges.length - 1] + STEPS * random() ** 6);
          let fallen = 0;
          edges.forEach((t, k) => {
            const ago = end - t;
            if (ago >= 0) fallen += (k % 2 === 0 ? 1 : -1) * (ago <= STEPS ? g[ago] : form.dc_ohm);
          });
          lowest = Math.max(lowest, fallen);
          highest = Math.max(highest, -fallen);
        }
      }
      expect(lowest).toBeLessThanOrEqual(fall.bound_V * (1 + 1e-9));
      expect(highest).toBeLessThanOrEqual(rise.bound_V * (1 + 1e-9));
      // They do come near, or the bound would not be tried.
      expect(lowest).toBeGreaterThan(0.6 * fall.bound_V);
      expect(highest).toBeGreaterThan(0.5 * rise.bound_V);
    });

  it('grows in proportion to the step', () => {
    const form = formOf(rails['package and die']);
    const one = worstPattern(form, { step_A: 1, rise_s: 1e-8 });
    const two = worstPattern(form, { step_A: 2, rise_s: 1e-8 });
    expect(two.fall.bound_V / one.fall.bound_V).toBeCloseTo(2, 12);
    expect(two.rise.bound_V / one.rise.bound_V).toBeCloseTo(2, 12);
  });

  it('never gets better with faster edges, and comes to that of ideal ones', () => {
    const form = formOf(rails['one resonance']);
    const bounds = [1e-4, 1e-5, 1e-6, 1e-7, 1e-8, 1e-11, 0].map(
      (rise_s) => worstPattern(form, { step_A: 1, rise_s }).fall.bound_V,
    );
    for (let i = 1; i < bounds.length; i++) expect(bounds[i]).toBeGreaterThanOrEqual(bounds[i - 1]);
    expect(bounds[5] / bounds[6]).toBeCloseTo(1, 9);
  });

  it('is one step and no rise for a rail without ringing', () => {
    const flat = formOf({
      source: { kind: 'rl', resistance_ohm: 1e-2, inductance_H: 1e-8 },
      lines: [line('c', 1, 1e-2, 1e-4, 0)],
      observe: 'pins',
    });
    const { fall, rise, dominant } = worstPattern(flat, { step_A: 2, rise_s: 1e-8 });
    expect(fall.bound_V).toBeCloseTo(0.02, 12);
    expect(fall.edges).toEqual([[0, 1]]);
    expect([rise.bound_V, rise.edges, rise.simulated_V, dominant]).toEqual([0, [], 0, null]);
  });

  it('names the resonance that makes most of it', () => {
    const { dominant } = worstPattern(formOf(rails['one resonance']), { step_A: 1, rise_s: 1e-8 });
    expect(dominant?.frequency_Hz).toBeCloseTo(1 / (2 * Math.PI * Math.sqrt(2e-12)), 3);
    expect(dominant?.q).toBeCloseTo(Math.sqrt(2e-8 / 1e-4) / 1.5e-3, 9);
    expect(dominant?.share).toBe(1);
  });

  it('stays bounded, and its bound above the pattern, for ringing that hardly ends', () => {
    const source = { kind: 'rl' as const, resistance_ohm: 1e-7, inductance_H: 2e-8 };
    const form = formOf({ source, lines: [line('c', 1, 1e-7, 1e-4, 0)], observe: 'pins' });
    const { fall, rise, dominant } = worstPattern(form, { step_A: 1, rise_s: 1e-8 });
    expect(dominant?.q).toBeGreaterThan(50_000);
    for (const run of [fall, rise]) {
      reaches(run, 0);
      expect(run.simulated_V).toBeGreaterThan(0);
      expect(run.edges.length).toBeLessThanOrEqual(2001);
      expect(run.time_s.length).toBeLessThanOrEqual(8000);
    }
    // One resonance alone: TV = height·(1 + q)/(1 − q) or nearly so, height √(L/C).
    expect(fall.bound_V / ((Math.sqrt(2e-4) * 2 * (dominant?.q ?? 0)) / Math.PI)).toBeCloseTo(1, 2);
  });

  it('refuses what makes no sense, by field', () => {
    const refuse = (name: string, load: { step_A: number; rise_s: number }, field: string) =>
      expect(() => worstPattern(formOf(rails[name]), load)).toThrow(
        expect.objectContaining({ name: 'EngineError', field }),
      );
    refuse('one resonance', { step_A: 0, rise_s: 1e-8 }, 'load_step.step_A');
    refuse('one resonance', { step_A: 1, rise_s: Number.NaN }, 'load_step.rise_s');
    refuse('three lines, inductance everywhere', { step_A: 1, rise_s: 0 }, 'load_step.rise_s');
  });
});
