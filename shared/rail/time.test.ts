import { describe, expect, it } from 'vitest';
import { compileRail } from '../engine/rail';
import { loadStep } from '../engine/time/load-step';
import { poleForm } from '../engine/time/pole-form';
import { type RailDocument, railDocumentSchema } from '../schemas/rail-document.schema';
import { allowance_V, loadStepOf } from './allowance';
import { conditionsOf } from './conditions';
import { cornerName, cornersOf, IN_SERVICE } from './corner';
import { documentIn } from './in-service';
import { networkOf } from './network';
import { mostCapacitance_F, railStartUp, railTime, worstCornerStep } from './time';

const document: RailDocument = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1,
    target: { kind: 'step', ripple_percent: 4, step_A: 3 },
    band_Hz: [1e4, 2e7],
    source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
    plane: { capacitance_F: 3e-10, resistance_ohm: 2e-3, inductance_H: 1e-11 },
    load_step: { before_A: 1, step_A: 3, rise_s: 2e-8, hold_s: 5e-5, fall_s: 2e-8 },
    start_up: { soft_start_s: 1e-3, current_limit_A: 0.5 },
  },
  parts: [
    {
      id: 'bulk',
      capacitance_F: 3.3e-4,
      esr_ohm: 7e-3,
      esl_H: 1.6e-9,
      mount_H: 9e-10,
      technology: 'polymer',
      tolerance: 'M',
    },
    {
      id: 'mid',
      capacitance_F: 1e-5,
      esr_ohm: 4e-3,
      esl_H: 4e-10,
      mount_H: 6e-10,
      technology: 'ceramic',
      dielectric: 'X5R',
      case: '0402',
      tolerance: 'K',
      rated_voltage_V: 4,
    },
  ],
  bank: [
    { part: 'bulk', count: 2 },
    { part: 'mid', count: 6 },
  ],
});

describe('a rail in time', () => {
  it('is stepped in the corner that goes furthest of all of them', () => {
    const all = cornersOf(conditionsOf(document.rail).conditions).map((corner) => {
      const form = poleForm(compileRail(networkOf(documentIn(document, corner))));
      const step = loadStep(form, loadStepOf(document.rail)?.step ?? never(), 1);
      return { name: cornerName(corner), furthest: Math.max(step.droop_V, step.overshoot_V) };
    });
    const most = all.reduce((a, b) => (b.furthest > a.furthest ? b : a));
    const worst = worstCornerStep(document);
    expect(worst?.corner).toBe(most.name);
    expect(Math.max(worst?.droop_V ?? 0, worst?.overshoot_V ?? 0)).toBe(most.furthest);
    expect(most.furthest).toBeGreaterThan(railTime(documentIn(document, IN_SERVICE)).step?.droop_V ?? 1);
  });

  it('leaves still, for the worst pattern, what rings beyond ten bands and five knees of the edge', () => {
    // 0.35/20 ns = 17.5 MHz: five of them are less than ten bands of 20 MHz; at 1 ns they are more.
    expect(railTime(document).limit_Hz).toBeCloseTo(2e8, 3);
    const fast = structuredClone(document);
    if (fast.rail.load_step) fast.rail.load_step.rise_s = 1e-9;
    expect(railTime(fast).limit_Hz).toBeCloseTo(1.75e9, 0);
  });

  it('never steps further than its worst pattern allows, with edges that the limit covers', () => {
    const { step, pattern } = railTime(documentIn(document, IN_SERVICE));
    expect(step?.droop_V).toBeLessThanOrEqual(pattern?.fall.bound_V ?? 0);
    expect(step?.overshoot_V).toBeLessThanOrEqual(pattern?.rise.bound_V ?? 0);
  });

  it('charges the most that the bank can hold', () => {
    // 2 · 330 µF · 1.2 + 6 · 10 µF · 1.1 + 300 pF of planes
    const most = 2 * 3.3e-4 * 1.2 + 6 * 1e-5 * 1.1 + 3e-10;
    expect(mostCapacitance_F(document)).toBeCloseTo(most, 12);
    const start = railStartUp(document);
    expect(start.current_A).toBeCloseTo(most / 1e-3, 9);
    expect(start).toMatchObject({ within_limit: false, assumed: false });
    expect(start.needed_s).toBeCloseTo(most / 0.5, 9);
  });

  it('takes its ripple from the budget where there is one, else from the target', () => {
    expect(allowance_V(document.rail)).toBeCloseTo(0.04, 15);
    const noise_budget = {
      tolerance_percent: 5,
      setpoint_percent: 1,
      dc_drop_V: 0.005,
      regulator_ripple_V: 0.005,
    };
    // 50 − 10 − 5 − 5 mV
    expect(allowance_V({ ...document.rail, noise_budget })).toBeCloseTo(0.03, 15);
    expect(allowance_V({ ...document.rail, target: { kind: 'flat', impedance_ohm: 1 } })).toBeNull();
  });
});

function never(): never {
  throw new Error('the document has a load step');
}
