import { readFileSync, writeFileSync } from 'node:fs';
import type { LineModel, RailNetwork } from '@shared/engine/network';
import { compileRail } from '@shared/engine/rail';
import { type LoadStep, loadStep } from '@shared/engine/time/load-step';
import { poleForm } from '@shared/engine/time/pole-form';
import { describe, expect, it } from 'vitest';
import { hasNgspice } from '../helpers/ngspice';
import {
  convergedTransient,
  extremesOf,
  runTransient,
  type StepExtremes,
  type TimedStep,
  transientDeck,
} from '../helpers/ngspice-transient';

/**
 * Load steps against ngspice, an open circuit simulator: the same rails as circuits, their transients converged by halving
 * the step until the extremes stay. Recorded results (ngspice 39) with their decks stand in the fixture and are checked always;
 * where ngspice is installed some are run anew. `RECORD_NGSPICE=1` writes the fixture (some minutes).
 */
const fixture = new URL('../fixtures/ngspice-transient.json', import.meta.url);

const rl = { kind: 'rl' as const, resistance_ohm: 5e-4, inductance_H: 2e-8 };
const damped = {
  kind: 'damped' as const,
  series_resistance_ohm: 4e-4,
  series_inductance_H: 3e-10,
  inductor_resistance_ohm: 1e-3,
  inductance_H: 4.7e-7,
  damping_ohm: 0.012,
  damping_inductance_H: 2e-9,
};
const plane = { capacitance_F: 2e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 };
const pack = { resistance_ohm: 8e-4, inductance_H: 2e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 2e-3 };
const line = (
  id: string,
  count: number,
  esr_ohm: number,
  capacitance_F: number,
  inductance_H: number,
): LineModel => ({ id, count, esr_ohm, capacitance_F, inductance_H });
const three = [
  line('bulk', 2, 6e-3, 470e-6, 2.6e-9),
  line('mid', 3, 3.5e-3, 22e-6, 1.1e-9),
  line('small', 7, 0.02, 100e-9, 0.7e-9),
];
const six = [
  line('polymer 330u', 2, 9e-3, 330e-6, 1.9e-9),
  line('47u 1206', 4, 3e-3, 21e-6, 1.3e-9),
  line('10u 0805', 6, 4e-3, 5.6e-6, 0.95e-9),
  line('1u 0603', 8, 8e-3, 0.72e-6, 0.8e-9),
  line('100n 0402', 12, 0.021, 94e-9, 0.68e-9),
  line('10n 0402', 10, 0.06, 10e-9, 0.66e-9),
];
const twelve = Array.from({ length: 12 }, (_, i) =>
  line(`line ${i}`, 1 + ((3 * i) % 7), 0.003 + 0.002 * i, 2.2e-4 / 2.3 ** i, 2.1e-9 / 1.08 ** i),
);
const twentyFive = Array.from({ length: 25 }, (_, i) =>
  line(`line ${i}`, 1 + (i % 5), 0.002 + 0.001 * i, 4.7e-4 / 1.8 ** i, 2.4e-9 / 1.06 ** i),
);
const timed = (
  before_A: number,
  step_A: number,
  rise_s: number,
  hold_s: number,
  fall_s: number,
  end_s: number,
): TimedStep => ({ before_A, step_A, rise_s, hold_s, fall_s, end_s });

const cases: Record<string, { network: RailNetwork; step: TimedStep }> = {
  'one capacitor without inductance on an R–L source': {
    network: {
      source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 2e-8 },
      lines: [line('bulk', 1, 3e-3, 47e-6, 0)],
      observe: 'pins',
    },
    step: timed(0, 1, 1e-7, 4e-5, 1e-7, 1e-4),
  },
  'three lines, fast edges': {
    network: { source: rl, lines: three, observe: 'pins' },
    step: timed(1, 5, 1e-8, 2e-5, 1e-8, 1e-4),
  },
  'three lines, slow edges from half load': {
    network: { source: rl, lines: three, observe: 'pins' },
    step: timed(5, 5, 2e-6, 5e-5, 1e-5, 1.5e-4),
  },
  'three lines and planes, a short pulse': {
    network: { source: rl, plane, lines: three, observe: 'pins' },
    step: timed(0, 10, 5e-9, 3e-8, 5e-9, 4e-6),
  },
  'damped source and planes, six lines': {
    network: { source: damped, plane, lines: six, observe: 'pins' },
    step: timed(2, 8, 2e-8, 4e-5, 4e-8, 2e-4),
  },
  'six lines, package and die, seen at the pins': {
    network: { source: rl, plane, package: pack, lines: six, observe: 'pins' },
    step: timed(0.5, 6, 1e-9, 2e-6, 1e-9, 8e-6),
  },
  'six lines, package and die, seen at the die': {
    network: { source: damped, plane, package: pack, lines: six, observe: 'die' },
    step: timed(0.5, 6, 1e-9, 2e-6, 1e-9, 8e-6),
  },
  'three lines, package without die capacitance, seen at the die': {
    network: { source: rl, package: { ...pack, die_capacitance_F: 0 }, lines: three, observe: 'die' },
    step: timed(1, 2, 3e-8, 1e-5, 5e-8, 6e-5),
  },
  'twelve lines and planes, hold shorter than the ringing': {
    network: { source: rl, plane, lines: twelve, observe: 'pins' },
    step: timed(0, 4, 1e-8, 2e-6, 1e-8, 2e-5),
  },
  'twelve lines, damped source, package and die, seen at the die': {
    network: { source: damped, package: pack, lines: twelve, observe: 'die' },
    step: timed(1, 3, 1e-7, 3e-5, 1e-7, 2e-4),
  },
  'twenty-five lines, fast edges': {
    network: { source: rl, lines: twentyFive, observe: 'pins' },
    step: timed(1, 5, 1e-8, 2e-5, 1e-8, 1e-4),
  },
  'twenty-five lines and planes, package and die, seen at the die': {
    network: { source: rl, plane, package: pack, lines: twentyFive, observe: 'die' },
    step: timed(1, 5, 1e-6, 2e-5, 1e-6, 1e-4),
  },
};
/** Quick enough to run each time, with four times the recorded step. */
const live = [
  'one capacitor without inductance on an R–L source',
  'three lines, slow edges from half load',
  'twelve lines, damped source, package and die, seen at the die',
  'twenty-five lines and planes, package and die, seen at the die',
];

interface Recorded extends StepExtremes {
  deck: string;
  max_s: number;
}
const recorded: Record<string, Recorded> = JSON.parse(readFileSync(fixture, 'utf8'));

if (process.env.RECORD_NGSPICE === '1') {
  const fresh: Record<string, Recorded> = {};
  for (const [name, { network, step }] of Object.entries(cases)) {
    const deck = transientDeck(network, step);
    fresh[name] = {
      deck,
      ...convergedTransient(deck, Math.min(step.end_s / 2000, step.rise_s / 4), step.end_s),
    };
  }
  writeFileSync(fixture, `${JSON.stringify(fresh, null, 1)}\n`);
}

function compare(ours: LoadStep, theirs: StepExtremes): void {
  const larger = Math.max(theirs.droop_V, theirs.overshoot_V);
  expect(Math.abs(ours.droop_V / theirs.droop_V - 1)).toBeLessThan(0.005);
  expect(Math.abs(ours.droop_time_s / theirs.droop_time_s - 1)).toBeLessThan(0.02);
  // An overshoot that is next to nothing has no relative error worth the name.
  expect(Math.abs(ours.overshoot_V - theirs.overshoot_V)).toBeLessThan(
    0.005 * Math.max(theirs.overshoot_V, 1e-3 * larger),
  );
}

describe('load steps against converged ngspice transients', () => {
  for (const [name, { network, step }] of Object.entries(cases)) {
    it(`${name}: recorded, droop and overshoot to 0.5 %, time of droop to 2 %`, () => {
      expect(recorded[name].deck).toBe(transientDeck(network, step));
      compare(loadStep(poleForm(compileRail(network)), step, 1), recorded[name]);
    });
  }
  for (const name of live) {
    const { network, step } = cases[name];
    it.runIf(hasNgspice)(`${name}: run live`, () => {
      const run = runTransient(transientDeck(network, step), 4 * recorded[name].max_s, step.end_s);
      compare(loadStep(poleForm(compileRail(network)), step, 1), extremesOf(run));
    });
  }
});
