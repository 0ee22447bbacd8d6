import { performance } from 'node:perf_hooks';
import type { RailNetwork } from '@shared/engine/network';
import { cornersOf, IN_SERVICE } from '@shared/rail/corner';
import { documentIn } from '@shared/rail/in-service';
import { networkOf } from '@shared/rail/network';
import { cornerResults, envelopeOver, headroomOf, missingParts } from '@shared/rail/worst-cases';
import { railYield } from '@shared/rail/yield';
import { type RailDocument, railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { complexImpedance } from '../helpers/complex-model';

const DIELECTRICS = ['X7R', 'X5R', 'X6S', 'C0G'];

/** 25 lines of 3 or 4 parts each (80 in all) under 16 corners: temperature, age, C and ESR. */
const document: RailDocument = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'bench',
    voltage_V: 0.9,
    target: { kind: 'flat', impedance_ohm: 0.004 },
    band_Hz: [1e4, 1e8],
    source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
    plane: { capacitance_F: 2e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
    conditions: { coldest_C: -20, usual_C: 50, hottest_C: 85, age_h: 87_660, vary: ['capacitance', 'esr'] },
  },
  parts: Array.from({ length: 25 }, (_, i) => ({
    id: `line ${i}`,
    capacitance_F: 4.7e-4 * 10 ** ((-4.6 * i) / 24),
    esr_ohm: 4e-3 + 6e-4 * i,
    esl_H: 3e-10 + 1e-11 * i,
    mount_H: 5e-10,
    technology: i < 3 ? 'polymer' : 'ceramic',
    ...(i >= 3 && { dielectric: DIELECTRICS[i % 4], case: '0402' }),
    tolerance: 'M',
    rated_voltage_V: 4,
    ...(i % 2 === 1 && {
      bias_curve: [
        [0, 1],
        [1, 0.92],
        [2, 0.75],
        [4, 0.45],
      ],
    }),
  })),
  bank: Array.from({ length: 25 }, (_, i) => ({ part: `line ${i}`, count: i % 5 === 0 ? 4 : 3 })),
});

const FREQUENCIES = Float64Array.from({ length: 241 }, (_, i) => 1e4 * 1e4 ** (i / 240));

function milliseconds(work: () => void, runs: number): number {
  work();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).sort((a, b) => a - b);
  return times[runs >> 1];
}

let sink = 0;
const plainSweep = (network: RailNetwork): void => {
  for (const f of FREQUENCIES) sink += complexImpedance(network, f).abs();
};

/** Issue “physics in full”: worst cases, missing part and yield of 25 lines, each against complex.js objects on the same grid. */
export function benchChecks(): string {
  const corners = cornersOf(
    document.rail.conditions ?? { coldest_C: 0, usual_C: 0, hottest_C: 0, age_h: 0, vary: [] },
  );
  const serving = documentIn(document, IN_SERVICE);
  const parts = document.bank.reduce((sum, line) => sum + line.count, 0);
  const plainOne = milliseconds(() => plainSweep(networkOf(serving)), 3);
  const exact = milliseconds(() => {
    sink += cornerResults(document)[0].tightest.headroom_dB;
  }, 7);
  const envelope = milliseconds(() => {
    sink += envelopeOver(document, FREQUENCIES).high_ohm[3];
  }, 7);
  const missing = milliseconds(() => {
    sink += missingParts(serving)[0].line;
  }, 7);
  const one = milliseconds(() => {
    sink += headroomOf(serving).tightest.headroom_dB;
  }, 15);
  const start = performance.now();
  const draws = railYield(document, { draws: 10_000, seed: 1 });
  let step = draws.next();
  while (!step.done) step = draws.next();
  const yieldTime = performance.now() - start;
  const row = (name: string, time: number, want: string, plain: number) =>
    `${name.padEnd(52)} ${time.toFixed(1).padStart(8)} ms  (wanted ${want}; complex.js objects ${plain.toFixed(0)} ms, ${(plain / time).toFixed(0)} ×)`;
  return [
    row(`${corners.length} corners, each exact at its peaks`, exact, '–', corners.length * plainOne),
    row(
      `envelope over ${corners.length} corners with its bound, ${FREQUENCIES.length} points`,
      envelope,
      '–',
      corners.length * plainOne,
    ),
    row('both', exact + envelope, '≤ 40 ms', 2 * corners.length * plainOne),
    row(`missing part, ${parts} parts on 25 lines`, missing, '≤ 100 ms', parts * plainOne),
    row('headroom of one bank', one, '–', plainOne),
    row('yield, 10 000 draws', yieldTime, '≤ 5 s', 10_000 * plainOne),
    sink === 0 ? 'nothing was computed' : '',
  ]
    .filter(Boolean)
    .join('\n');
}
