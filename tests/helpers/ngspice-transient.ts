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
    `.save v(${port})`,
    '.options reltol=1e-5 abstol=1e-9 vntol=1e-9',
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

/** Runs a deck with steps of at most `max_s`; throws when ngspice gave up before `end_s`. */
export function runTransient(deck: string, max_s: number, end_s: number): Transient {
  const folder = mkdtempSync(join(tmpdir(), 'millpond-ngspice-'));
  try {
    const output = join(folder, 'out.raw');
    const input = join(folder, 'deck.cir');
    writeFileSync(input, deck.replaceAll('MAX_STEP', max_s.toExponential(6)).replace('OUTPUT', output));
    execFileSync('ngspice', ['-b', input], { stdio: 'ignore', timeout: 300_000 });
    const run = readBinary(readFileSync(output));
    if (!((run.time_s.at(-1) ?? 0) > 0.999 * end_s)) throw new Error('ngspice gave up');
    return run;
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

/**
 * Quarters the largest step until droop and overshoot have twice changed by less than 0.05 % of the larger of the two: once may be
 * chance, where ngspice chooses smaller steps by itself.
 */
export function convergedTransient(
  deck: string,
  first_s: number,
  end_s: number,
): StepExtremes & { max_s: number } {
  let before = extremesOf(runTransient(deck, first_s, end_s));
  let calm = 0;
  for (let round = 1; round < 8; round++) {
    const max_s = first_s / 4 ** round;
    const now = extremesOf(runTransient(deck, max_s, end_s));
    const scale = Math.max(now.droop_V, now.overshoot_V);
    const change = Math.max(
      Math.abs(now.droop_V - before.droop_V),
      Math.abs(now.overshoot_V - before.overshoot_V),
    );
    calm = change < 5e-4 * scale ? calm + 1 : 0;
    if (calm === 2) return { max_s, ...now };
    before = now;
  }
  throw new Error('the transient did not converge');
}
