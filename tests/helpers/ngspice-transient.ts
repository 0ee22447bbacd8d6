import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { RailNetwork } from '@shared/engine/network';
import type { LoadStepInput } from '@shared/engine/time/load-step-input';
import { acDeck } from './ngspice';

/** A load step with an end, so that both sides run equally long. */
export type TimedStep = LoadStepInput & { end_s: number };

/** Equal capacitors as one: the same circuit, quicker to run. */
const folded = (network: RailNetwork): RailNetwork => ({
  ...network,
  lines: network.lines.map((line) => ({
    ...line,
    count: 1,
    esr_ohm: line.esr_ohm / line.count,
    inductance_H: line.inductance_H / line.count,
    capacitance_F: line.capacitance_F * line.count,
  })),
});

/** The rail as a circuit whose load steps up and back; MAX_STEP and OUTPUT are put in when it is run. */
export function transientDeck(network: RailNetwork, step: TimedStep): string {
  const lines = acDeck(folded(network), 1, 10, 1).split('\n');
  const circuit = lines.slice(
    0,
    lines.findIndex((line) => line.startsWith('Iload')),
  );
  const port = network.observe === 'die' ? '2' : '1';
  const { before_A, step_A, rise_s, hold_s, fall_s, end_s } = step;
  const high_A = before_A + step_A;
  const corners = [
    [0, before_A],
    [rise_s, high_A],
    [rise_s + hold_s, high_A],
    [rise_s + hold_s + fall_s, before_A],
  ];
  const pairs = corners.map((corner) => corner.map((value) => value.toExponential(16)).join(' ')).join(' ');
  return [
    ...circuit,
    `Iload ${port} 0 PWL(${pairs})`,
    '.options reltol=1e-6 abstol=1e-12 vntol=1e-12 chgtol=1e-18 trtol=1',
    '.control',
    'set filetype=binary',
    `tran MAX_STEP ${end_s} 0 MAX_STEP`,
    `write OUTPUT v(${port})`,
    'quit 0',
    '.endc',
    '.end',
    '',
  ].join('\n');
}

export interface Transient {
  time_s: Float64Array;
  voltage_V: Float64Array;
}

/** Runs a deck with steps of at most `max_s`. */
export function runTransient(deck: string, max_s: number): Transient {
  const folder = mkdtempSync(join(tmpdir(), 'millpond-ngspice-'));
  try {
    const output = join(folder, 'out.raw');
    const input = join(folder, 'deck.cir');
    writeFileSync(input, deck.replaceAll('MAX_STEP', max_s.toExponential(6)).replace('OUTPUT', output));
    execFileSync('ngspice', ['-b', input], { stdio: 'ignore', timeout: 300_000 });
    return readBinary(readFileSync(output));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Reads a binary raw file with two real variables: time and one voltage. */
function readBinary(raw: Buffer): Transient {
  const start = raw.indexOf('Binary:\n') + 8;
  const count = (raw.length - start) >> 4;
  const at = (k: number) => raw.readDoubleLE(start + 8 * k);
  return {
    time_s: Float64Array.from({ length: count }, (_, i) => at(2 * i)),
    voltage_V: Float64Array.from({ length: count }, (_, i) => at(2 * i + 1)),
  };
}

export interface StepExtremes {
  droop_V: number;
  droop_time_s: number;
  overshoot_V: number;
  overshoot_time_s: number;
}

/** Largest fall below and largest rise above the first value. */
export function extremesOf({ time_s, voltage_V }: Transient): StepExtremes {
  let low = 0;
  let high = 0;
  voltage_V.forEach((v, i) => {
    if (v < voltage_V[low]) low = i;
    if (v > voltage_V[high]) high = i;
  });
  return {
    droop_V: voltage_V[0] - voltage_V[low],
    droop_time_s: time_s[low],
    overshoot_V: voltage_V[high] - voltage_V[0],
    overshoot_time_s: time_s[high],
  };
}

/** Halves the largest step until droop and overshoot change by less than 0.05 % of the larger of the two. */
export function convergedTransient(deck: string, first_s: number): { max_s: number; run: Transient } {
  let max_s = first_s;
  let run = runTransient(deck, max_s);
  for (let round = 0; round < 10; round++) {
    const before = extremesOf(run);
    max_s /= 2;
    run = runTransient(deck, max_s);
    const now = extremesOf(run);
    const scale = Math.max(now.droop_V, now.overshoot_V);
    const change = Math.max(
      Math.abs(now.droop_V - before.droop_V),
      Math.abs(now.overshoot_V - before.overshoot_V),
    );
    if (change < 5e-4 * scale) return { max_s, run };
  }
  throw new Error('the transient did not converge');
}
