import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { RailNetwork } from '@shared/engine/network';

/** True where the open circuit simulator ngspice is installed. */
export const hasNgspice = spawnSync('ngspice', ['--version'], { stdio: 'ignore' }).status === 0;

/** A rail as a circuit: node 1 the pins, node 2 the die; 1 A of alternating current drawn where the impedance is looked at. */
export function acDeck(network: RailNetwork, low_Hz: number, high_Hz: number, perDecade: number): string {
  const lines: string[] = ['* rail'];
  let serial = 0;
  /** A series branch between two nodes; parts of zero value are left out. */
  const branch = (from: string, to: string, r: number, l: number, c: number) => {
    const pieces: [string, number][] = [
      ['R', r],
      ['L', l],
      ['C', c],
    ];
    const real = pieces.filter(([kind, value]) => (kind === 'C' ? Number.isFinite(value) : value > 0));
    let node = from;
    real.forEach(([kind, value], i) => {
      const next = i === real.length - 1 ? to : `n${++serial}`;
      lines.push(`${kind}${++serial} ${node} ${next} ${value.toExponential(16)}`);
      node = next;
    });
  };
  const { source, plane, package: model } = network;
  if (source.kind === 'rl')
    branch('1', '0', source.resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY);
  if (source.kind === 'damped') {
    const hasSeries = source.series_resistance_ohm > 0 || source.series_inductance_H > 0;
    const inner = hasSeries ? 'reg' : '1';
    if (hasSeries)
      branch('1', 'reg', source.series_resistance_ohm, source.series_inductance_H, Number.POSITIVE_INFINITY);
    branch(inner, '0', source.inductor_resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY);
    branch(inner, '0', source.damping_ohm, source.damping_inductance_H, Number.POSITIVE_INFINITY);
  }
  if (plane) branch('1', '0', plane.resistance_ohm, plane.inductance_H, plane.capacitance_F);
  for (const line of network.lines)
    for (let i = 0; i < line.count; i++)
      branch('1', '0', line.esr_ohm, line.inductance_H, line.capacitance_F);
  if (model) {
    branch('1', '2', model.resistance_ohm, model.inductance_H, Number.POSITIVE_INFINITY);
    if (model.die_capacitance_F > 0) branch('2', '0', model.die_resistance_ohm, 0, model.die_capacitance_F);
  }
  const port = network.observe === 'die' ? '2' : '1';
  // A conductance far below all others keeps a node without a path at 0 Hz from being singular.
  lines.push('Rdc 1 0 1e12', `Iload 0 ${port} AC 1`);
  lines.push('.control', 'set filetype=ascii', 'set numdgt=14', `ac dec ${perDecade} ${low_Hz} ${high_Hz}`);
  lines.push(`write OUTPUT v(${port})`, 'quit 0', '.endc', '.end', '');
  return lines.join('\n');
}

export interface AcPoint {
  frequency_Hz: number;
  re_ohm: number;
  im_ohm: number;
}

/** Runs a deck and reads the complex voltage, which at 1 A is the impedance. */
export function runAc(deck: string): AcPoint[] {
  const folder = mkdtempSync(join(tmpdir(), 'millpond-ngspice-'));
  try {
    const output = join(folder, 'out.raw');
    const input = join(folder, 'deck.cir');
    writeFileSync(input, deck.replace('OUTPUT', output));
    execFileSync('ngspice', ['-b', input], { stdio: 'ignore', timeout: 60_000 });
    return readRaw(readFileSync(output, 'utf8'));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Reads an ASCII raw file with two complex variables: frequency and one voltage. */
function readRaw(text: string): AcPoint[] {
  const rows = text.slice(text.indexOf('Values:') + 7).match(/[-+0-9.e]+,[-+0-9.e]+/gi) ?? [];
  const numbers = rows.map((row) => row.split(',').map(Number));
  const points: AcPoint[] = [];
  for (let i = 0; i + 1 < numbers.length; i += 2)
    points.push({ frequency_Hz: numbers[i][0], re_ohm: numbers[i + 1][0], im_ohm: numbers[i + 1][1] });
  return points;
}
