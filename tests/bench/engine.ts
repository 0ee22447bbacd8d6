import { spawnSync } from 'node:child_process';
import { performance } from 'node:perf_hooks';
import { BankSum, sampleAdmittance } from '@shared/engine/bank-sum';
import { lineBranch } from '@shared/engine/branch';
import { impedanceOver } from '@shared/engine/impedance-over';
import { compileRail } from '@shared/engine/rail';
import { analyseBench } from '@workers/analysis/analysis';
import Complex from 'complex.js';

const LINES = 25;
const POINTS = 1000;

const lines = Array.from({ length: LINES }, (_, i) => ({
  id: `line ${i}`,
  count: 1 + (i % 5),
  esr_ohm: 0.002 + 0.001 * i,
  capacitance_F: 4.7e-4 / 1.8 ** i,
  inductance_H: 2.4e-9 / 1.06 ** i,
}));
const branches = lines.map((line) => lineBranch(line, 'line'));
const omega = Float64Array.from({ length: POINTS }, (_, i) => 2 * Math.PI * 1e4 * 1e4 ** (i / (POINTS - 1)));
const jw = Array.from(omega, (w) => new Complex(0, w));

/** Median time of one run in microseconds, after a warm-up. */
function microseconds(work: () => void, runs: number): number {
  for (let i = 0; i < Math.ceil(runs / 4); i++) work();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).sort((a, b) => a - b);
  return times[runs >> 1] * 1000;
}

const z = new Float64Array(POINTS);
let sink = 0;

const rail = compileRail({ source: { kind: 'open' }, lines, observe: 'pins' });
const frequency = omega.map((w) => w / (2 * Math.PI));

/** One sweep of the whole bank, from the parts' values to Z: what a changed part costs. */
function sweep(): void {
  sink += impedanceOver(rail, frequency).re_ohm[7];
}

/** The floor: one division for each line and frequency. */
function divisions(): void {
  for (let k = 0; k < LINES; k++) for (let i = 0; i < POINTS; i++) z[i] = 1 / (omega[i] + k);
  sink += z[7];
}

function objects(): void {
  const one = new Complex(1, 0);
  for (const s of jw) {
    let y = new Complex(0, 0);
    for (const line of lines) {
      const impedance = new Complex(line.esr_ohm, 0)
        .add(s.mul(line.inductance_H))
        .add(one.div(s.mul(line.capacitance_F)));
      y = y.add(one.div(impedance).mul(line.count));
    }
    sink += one.div(y).abs();
  }
}

const NUMPY = `
import numpy as np, timeit, json, sys
p = json.loads(sys.stdin.read())
w = 2j*np.pi*1e4*1e4**(np.arange(${POINTS})/${POINTS - 1})
n, r, l, c = (np.array(p[k])[:, None] for k in ('n', 'r', 'l', 'c'))
f = lambda: np.abs(1/np.sum(n/(r + w*l + 1/(w*c)), axis=0))
f(); print(1e6*min(timeit.repeat(f, number=20, repeat=7))/20)
`;

function numpy(): number | null {
  const values = {
    n: lines.map((line) => line.count),
    r: lines.map((line) => line.esr_ohm),
    l: lines.map((line) => line.inductance_H),
    c: lines.map((line) => line.capacitance_F),
  };
  const run = spawnSync('python3', ['-c', NUMPY], { input: JSON.stringify(values), encoding: 'utf8' });
  const result = Number(run.stdout);
  return run.status === 0 && result > 0 ? result : null;
}

/** Engine section 6: one sweep of 25 lines × 1000 frequencies against its floor, numpy and an object a number. */
export function benchEngine(): string {
  const floor = microseconds(divisions, 400);
  const ours = microseconds(sweep, 400);
  const bank = new BankSum(
    frequency,
    branches.map((branch) => sampleAdmittance(branch, frequency)),
    lines.map((line) => line.count),
  );
  let count = 0;
  const step = microseconds(() => bank.setCount(12, ++count % 9), 2000);
  const resum = microseconds(() => bank.resum(), 400);
  const object = microseconds(objects, 12);
  const python = numpy();
  const spec = {
    name: 'bench',
    voltage_V: 1,
    target: { kind: 'flat' as const, impedance_ohm: 0.01 },
    band_Hz: [1e4, 1e8] as [number, number],
    source: { kind: 'rl' as const, resistance_ohm: 5e-4, inductance_H: 2e-8 },
    observe: 'pins' as const,
  };
  const request = {
    spec,
    span_Hz: [1e4, 1e8] as const,
    corner: null,
    lines: lines.map(({ id, count: n, esr_ohm, capacitance_F, inductance_H }) => ({
      part: { id, capacitance_F, esr_ohm, esl_H: inductance_H, mount_H: 0 },
      count: n,
      mount_H: null,
      distance_m: null,
    })),
  };
  const whole = microseconds(() => {
    sink += analyseBench(request, null).analysis.tightest.impedance_ohm;
  }, 60);
  let samples = analyseBench(request, null).samples;
  const again = microseconds(() => {
    const changed = request.lines.map((line, i) => (i === 12 ? { ...line, count: ++count % 9 } : line));
    const answer = analyseBench({ ...request, lines: changed }, samples);
    samples = answer.samples;
    sink += answer.analysis.tightest.impedance_ohm;
  }, 60);
  const row = (name: string, time: number | null, note: string) =>
    `${name.padEnd(46)} ${time === null ? '–'.padStart(10) : time.toFixed(1).padStart(10)}  ${note}`;
  const times = (value: number | null) =>
    value === null ? 'numpy is not installed' : `${(value / ours).toFixed(1)} × the sweep`;
  return [
    `${'25 lines × 1000 frequencies'.padEnd(46)} ${'µs'.padStart(10)}`,
    row('one division an element (the floor)', floor, `${(floor / ours).toFixed(2)} × the sweep`),
    row('the sweep', ours, ''),
    row('numpy, one line', python, `${times(python)} (aim ≥ 20)`),
    row('an object a complex number (complex.js)', object, `${times(object)} (aim ≥ 40)`),
    row('one changed count, incrementally', step, `${(resum / step).toFixed(1)} times faster than a new sum`),
    row('the bench’s whole analysis of 25 lines', whole, 'refined sweep, peaks, shares, headroom'),
    row('the same after a changed count', again, 'samples kept'),
    sink === 0 ? 'nothing was computed' : '',
  ].join('\n');
}
