import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { railNetwork } from '../../../tests/helpers/random-network';
import type { RailNetwork } from '../network';
import { compileRail } from '../rail';
import { loadStep } from './load-step';
import type { LoadStepInput } from './load-step-input';
import { type PoleForm, poleForm } from './pole-form';
import { responseAt } from './response';

const network: RailNetwork = {
  source: { kind: 'rl', resistance_ohm: 2e-3, inductance_H: 1e-8 },
  lines: [{ id: 'c', count: 1, esr_ohm: 2e-3, capacitance_F: 1e-4, inductance_H: 0 }],
  observe: 'pins',
};
const form = poleForm(compileRail(network));
const step: LoadStepInput = { before_A: 1, step_A: 5, rise_s: 1e-8, hold_s: 5e-5, fall_s: 2e-8 };

const cornersOf = ({ before_A, step_A, rise_s, hold_s, fall_s }: LoadStepInput) =>
  [
    [0, before_A],
    [rise_s, before_A + step_A],
    [rise_s + hold_s, before_A + step_A],
    [rise_s + hold_s + fall_s, before_A],
  ] as const;

/** Lowest and highest of 60 000 dense points, closer after each edge. */
function dense(one: PoleForm, given: LoadStepInput, end_s: number) {
  const starts = cornersOf(given).map(([t]) => t);
  const times = Float64Array.from(
    starts.flatMap((t) =>
      Array.from({ length: 15_000 }, (_, i) => t + 1e-12 * (end_s * 1e12) ** (i / 15_000)),
    ),
  )
    .map((t) => Math.min(t, end_s * (1 - 1e-12)))
    .sort();
  const v = responseAt(one, cornersOf(given), times);
  const settled = -one.dc_ohm * given.before_A;
  return {
    droop_V: settled - v.reduce((a, b) => Math.min(a, b)),
    overshoot_V: v.reduce((a, b) => Math.max(a, b)) - settled,
  };
}

describe('a load step', () => {
  const answer = loadStep(form, step, 1.2);

  it('begins settled at time 0, and settles there again', () => {
    expect(answer.time_s[0]).toBe(0);
    expect(answer.voltage_V[0]).toBeCloseTo(1.2 - 2e-3, 12);
    expect(answer.settled_V).toBeCloseTo(1.2 - 2e-3, 12);
    expect(answer.voltage_V[answer.voltage_V.length - 1]).toBeCloseTo(1.2 - 2e-3, 4);
    expect(answer.time_s[answer.time_s.length - 1]).toBeGreaterThan(5e-5 + 2e-5);
  });

  it('has rising times, at most 20 000, with the extremes among them', () => {
    const { time_s, voltage_V } = answer;
    expect(time_s.length).toBeLessThanOrEqual(20_000);
    for (let i = 1; i < time_s.length; i++) expect(time_s[i]).toBeGreaterThan(time_s[i - 1]);
    const low = time_s.indexOf(answer.droop_time_s);
    const high = time_s.indexOf(answer.overshoot_time_s);
    expect(voltage_V[low]).toBeCloseTo(answer.settled_V - answer.droop_V, 12);
    expect(voltage_V[high]).toBeCloseTo(answer.settled_V + answer.overshoot_V, 12);
    expect(Math.min(...voltage_V)).toBeCloseTo(voltage_V[low], 12);
    expect(Math.max(...voltage_V)).toBeCloseTo(voltage_V[high], 12);
  });

  it('draws what the exact response is, and straight lines between points are close to it', () => {
    const { time_s, voltage_V, droop_V } = answer;
    const middle = time_s.slice(1).map((t, i) => 0.5 * (t + time_s[i]));
    responseAt(form, cornersOf(step), middle).forEach((v, i) => {
      const line = 0.5 * (voltage_V[i] + voltage_V[i + 1]);
      expect(Math.abs(1.2 + v - line)).toBeLessThan(1e-3 * droop_V);
    });
  });

  it('goes in proportion to the step', () => {
    const twice = loadStep(form, { ...step, step_A: 10 }, 1.2);
    expect(twice.droop_V / answer.droop_V).toBeCloseTo(2, 9);
    expect(twice.droop_time_s).toBeCloseTo(answer.droop_time_s, 15);
  });

  it('ends when it is told to, before or after it has settled', () => {
    for (const end_s of [4e-9, 3e-7, 3e-5, 2e-3]) {
      const cut = loadStep(form, { ...step, end_s }, 1.2);
      expect(cut.time_s[cut.time_s.length - 1]).toBeCloseTo(end_s, 12);
      expect(cut.droop_time_s).toBeLessThanOrEqual(end_s);
      expect(cut.droop_V).toBeCloseTo(dense(form, step, end_s).droop_V, 7);
    }
  });

  it('has no overshoot where none is', () => {
    const resistive = poleForm(
      compileRail({ ...network, source: { kind: 'rl', resistance_ohm: 2e-3, inductance_H: 0 } }),
    );
    const { overshoot_V, overshoot_time_s, droop_V } = loadStep(resistive, step, 1);
    expect([overshoot_V, overshoot_time_s]).toEqual([0, 0]);
    expect(droop_V).toBeCloseTo(0.01, 9);
  });

  it('catches the jumps of a rail whose every path has inductance', () => {
    const alone = poleForm(compileRail({ ...network, lines: [] }));
    const { droop_V, droop_time_s, overshoot_V, overshoot_time_s } = loadStep(alone, step, 1);
    // R–L alone: L·di/dt at its most at the end of the rise, and the other way when the fall begins.
    expect(droop_V).toBeCloseTo(1e-8 * 5e8 + 2e-3 * 5, 9);
    expect(droop_time_s).toBeCloseTo(1e-8, 15);
    expect(overshoot_V).toBeCloseTo(1e-8 * 2.5e8, 9);
    expect(overshoot_time_s).toBeCloseTo(5e-5 + 1e-8 + 2e-8, 12);
  });

  it('stays within its points where it rings for very long', () => {
    const lines = [{ ...network.lines[0], esr_ohm: 1e-7 }];
    const source = { kind: 'rl' as const, resistance_ohm: 1e-7, inductance_H: 1e-8 };
    const long = loadStep(poleForm(compileRail({ ...network, source, lines })), { ...step, hold_s: 1e-3 }, 1);
    expect(long.time_s.length).toBeLessThanOrEqual(20_000);
    // Undamped: 5 A · √(L/C) = 0.05 V below, and with the second edge up to twice that.
    expect(long.droop_V).toBeGreaterThan(0.0499);
    expect(long.droop_V).toBeLessThan(0.1001);
  });

  it('draws ringing that is too long to be followed all the way, to its end', () => {
    // Q = 70 000 at 150 kHz while the load is held for half a minute: millions of swings.
    const lines = [{ ...network.lines[0], esr_ohm: 1e-7 }];
    const source = { kind: 'rl' as const, resistance_ohm: 1e-7, inductance_H: 1e-8 };
    const { time_s, voltage_V } = loadStep(
      poleForm(compileRail({ ...network, source, lines })),
      { ...step, hold_s: 30 },
      1,
    );
    expect(time_s.length).toBeLessThanOrEqual(20_000);
    expect(time_s[time_s.length - 1]).toBeGreaterThan(30);
    expect(voltage_V.every(Number.isFinite)).toBe(true);
  });

  it('finds no less than dense points do, and hardly more, on random rails', () => {
    fc.assert(
      fc.property(
        railNetwork,
        fc.constantFrom(1e-9, 1e-7, 1e-5),
        fc.constantFrom(1e-8, 1e-6, 1e-4),
        (random, edge_s, hold_s) => {
          const one = poleForm(compileRail(random));
          const given = {
            before_A: 1,
            step_A: 2,
            rise_s: edge_s,
            hold_s,
            fall_s: edge_s,
            end_s: 5 * (edge_s + hold_s),
          };
          const ours = loadStep(one, given, 1);
          const theirs = dense(one, given, given.end_s);
          const scale = Math.max(ours.droop_V, ours.overshoot_V);
          expect(ours.droop_V).toBeGreaterThan(theirs.droop_V - 1e-6 * scale);
          expect(ours.overshoot_V).toBeGreaterThan(theirs.overshoot_V - 1e-6 * scale);
          const at = responseAt(one, cornersOf(given), Float64Array.of(ours.droop_time_s * (1 - 1e-12)))[0];
          expect(Math.abs(-one.dc_ohm - at - ours.droop_V)).toBeLessThan(1e-6 * scale);
        },
      ),
      { numRuns: 40, seed: 45 },
    );
  });

  it('refuses what makes no sense, by field', () => {
    const refuse = (change: Partial<LoadStepInput>, field: string) =>
      expect(() => loadStep(form, { ...step, ...change }, 1)).toThrow(
        expect.objectContaining({ name: 'EngineError', field }),
      );
    refuse({ before_A: -1 }, 'load_step.before_A');
    refuse({ step_A: 0 }, 'load_step.step_A');
    refuse({ rise_s: 0 }, 'load_step.rise_s');
    refuse({ hold_s: Number.NaN }, 'load_step.hold_s');
    refuse({ fall_s: Number.POSITIVE_INFINITY }, 'load_step.fall_s');
    refuse({ end_s: -1 }, 'load_step.end_s');
    expect(() => loadStep(form, step, Number.NaN)).toThrow(expect.objectContaining({ field: 'voltage_V' }));
  });
});
