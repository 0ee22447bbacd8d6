import { performance } from 'node:perf_hooks';
import type { RailNetwork } from '@shared/engine/network';
import { compileRail } from '@shared/engine/rail';
import { loadStep } from '@shared/engine/time/load-step';
import { stepStretches } from '@shared/engine/time/load-step-input';
import { poleForm } from '@shared/engine/time/pole-form';
import { responseAt } from '@shared/engine/time/response';
import { worstPattern } from '@shared/engine/time/worst-pattern';
import { hasNgspice } from '../helpers/ngspice';
import { extremesOf, runTransient, transientDeck } from '../helpers/ngspice-transient';

const LINES = 25;
const POINTS = 20_000;

const network: RailNetwork = {
  source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
  lines: Array.from({ length: LINES }, (_, i) => ({
    id: `line ${i}`,
    count: 1 + (i % 5),
    esr_ohm: 0.002 + 0.001 * i,
    capacitance_F: 4.7e-4 / 1.8 ** i,
    inductance_H: 2.4e-9 / 1.06 ** i,
  })),
  observe: 'pins',
};
const step = { before_A: 1, step_A: 5, rise_s: 1e-8, hold_s: 2e-5, fall_s: 1e-8, end_s: 1e-4 };
/** Steps in a rise with which the plain loop comes to about the 0.5 % that is promised. */
const STEPS_A_RISE = 200;

/** Median time of one run in milliseconds, after a warm-up. */
function milliseconds(work: () => void, runs: number): number {
  for (let i = 0; i < Math.ceil(runs / 4); i++) work();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).sort((a, b) => a - b);
  return times[runs >> 1];
}

/** One branch of the plain loop: its current, the voltage on its capacitor, and its companion model for a step. */
interface Companion {
  r: number;
  twoLPerStep: number;
  halfStepPerC: number;
  z: number;
  i: number;
  vC: number;
}

/** The largest droop by trapezoidal companion models at a fixed step, one object a branch: what the exact response replaces. */
function trapezoidal(step_s: number): number {
  const settled_V = -step.before_A * 5e-4;
  const companion = (r: number, l: number, c: number, i: number, vC: number): Companion => {
    const [twoLPerStep, halfStepPerC] = [(2 * l) / step_s, step_s / (2 * c)];
    return { r, twoLPerStep, halfStepPerC, z: r + twoLPerStep + halfStepPerC, i, vC };
  };
  const branches = network.lines.map(({ count, esr_ohm, inductance_H, capacitance_F }) =>
    companion(esr_ohm / count, inductance_H / count, capacitance_F * count, 0, settled_V),
  );
  branches.push(companion(5e-4, 2e-8, Number.POSITIVE_INFINITY, -step.before_A, 0));
  const stretches = stepStretches(step);
  const siemens = branches.reduce((sum, { z }) => sum + 1 / z, 0);
  let v = settled_V;
  let lowest = v;
  let place = 0;
  for (let t = step_s; t <= step.end_s; t += step_s) {
    while (place + 1 < stretches.length && t > stretches[place + 1].start_s) place++;
    const { start_s, current_A, slope } = stretches[place];
    let sum = -(current_A + slope * (t - start_s));
    const history = branches.map(
      ({ r, twoLPerStep, halfStepPerC, i, vC }) => v + (twoLPerStep - r - halfStepPerC) * i - 2 * vC,
    );
    history.forEach((h, k) => {
      sum -= h / branches[k].z;
    });
    const before = v;
    v = sum / siemens;
    branches.forEach((branch, k) => {
      const next = (v + history[k]) / branch.z;
      branch.vC += branch.halfStepPerC * (next + branch.i);
      branch.i = next;
    });
    // The mean of two steps: where every path has inductance the rule itself rings from step to step after each corner.
    lowest = Math.min(lowest, 0.5 * (v + before));
  }
  return settled_V - lowest;
}

/** The time domain of a rail of 25 lines, against the same step in ngspice and in a plain trapezoidal loop. */
export function benchTime(): string {
  const rail = compileRail(network);
  const form = poleForm(rail);
  const times = Float64Array.from({ length: POINTS }, (_, i) => (i * step.end_s) / POINTS);
  const current = [
    [0, 1],
    [1e-8, 6],
    [2.001e-5, 6],
    [2.002e-5, 1],
  ] as const;
  let sink = 0;
  const poles = milliseconds(() => {
    sink += poleForm(rail).poleRe[0];
  }, 200);
  const points = milliseconds(() => {
    sink += responseAt(form, current, times)[7];
  }, 60);
  const drawn = loadStep(form, step, 1).time_s.length;
  const exact_V = loadStep(form, step, 1).droop_V;
  const wholeStep = milliseconds(() => {
    sink += loadStep(form, step, 1).droop_V;
  }, 60);
  const pattern = milliseconds(() => {
    sink += worstPattern(form, step).fall.bound_V;
  }, 24);
  let plain_V = 0;
  const plain = milliseconds(() => {
    plain_V = trapezoidal(step.rise_s / STEPS_A_RISE);
  }, 1);
  const rows: [string, number | null, string][] = [
    ['pole form, from the compiled rail', poles, `${form.poleRe.length} modes`],
    [`response at ${POINTS} even times`, points, ''],
    ['load step: curve and exact extremes', wholeStep, `${drawn} points`],
    ['worst pattern: bound, both patterns, their curves', pattern, ''],
  ];
  const answer = poles + wholeStep;
  const off = (droop_V: number) => `droop ${(100 * (droop_V / exact_V - 1)).toFixed(3)} % off`;
  const ratio = (time: number) => `${(time / answer).toFixed(0)} × pole form and load step`;
  rows.push([`trapezoidal loop, ${STEPS_A_RISE} steps a rise`, plain, `${ratio(plain)}, ${off(plain_V)}`]);
  if (hasNgspice) {
    const deck = transientDeck(network, step);
    const start = performance.now();
    const run = runTransient(deck, step.rise_s / 4, step.end_s);
    const spent = performance.now() - start;
    rows.push(['ngspice, the same step', spent, `${ratio(spent)}, ${off(extremesOf(run).droop_V)}`]);
  } else rows.push(['ngspice, the same step', null, 'ngspice is not installed']);
  return [
    `${`${LINES} lines`.padEnd(50)} ${'ms'.padStart(9)}`,
    ...rows.map(
      ([name, time, note]) =>
        `${name.padEnd(50)} ${(time === null ? '–' : time.toFixed(2)).padStart(9)}  ${note}`,
    ),
    sink === 0 ? 'nothing was computed' : '',
  ].join('\n');
}
