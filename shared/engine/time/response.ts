import { EngineError } from '../errors';
import { growth, growthScratch } from './growth';
import { checkCurrent, type LoadCurrent, type Stretch, stretchesOf, walk } from './load-current';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';

/** Two steps are equal when they differ by no more than this share. */
const SAME_STEP = 1e-9;
/** What a mode may shrink to before it counts as nothing: far below any rounding, and above the numbers that compute slowly. */
const NOTHING = 1e-250;

/**
 * The voltage at `time_s` (seconds, not falling) under a load current, as its difference from the voltage without load, in
 * volts: below zero where the load pulls the rail down. Before the first corner the rail is settled. Exact at every instant (see
 * modes.ts): the times need not be close to each other. Runs of equal steps cost one complex multiplication a mode and
 * point, others an exponential. Where the voltage jumps, the value after the jump. Throws EngineError as `checkCurrent` does, and
 * for times that fall or are not finite.
 */
export function responseAt(form: PoleForm, current: LoadCurrent, time_s: Float64Array): Float64Array {
  checkCurrent(current, form);
  time_s.forEach((time, i) => {
    if (!Number.isFinite(time) || (i > 0 && time < time_s[i - 1]))
      throw new EngineError('time_s', 'times must be finite and must not fall');
  });
  const out = new Float64Array(time_s.length);
  const modes = new Modes(form);
  let i = 0;
  for (; i < out.length && time_s[i] < current[0][0]; i++) out[i] = 0 - form.dc_ohm * current[0][1];
  walk(modes, current[0][1], stretchesOf(current), (stretch) => {
    const { start_s, length_s, slope } = stretch;
    const end_s = start_s + length_s;
    let now_s = start_s;
    while (i < out.length && time_s[i] < end_s) {
      const many = equalSteps(time_s, i, end_s);
      modes.advance(time_s[i] - now_s, slope);
      fillRun(modes, stretch, time_s, i, many, out);
      i += many;
      now_s = time_s[i - 1];
    }
    if (Number.isFinite(end_s)) modes.advance(end_s - now_s, slope);
    return true;
  });
  return out;
}

/** How many times from place `i` on lie at equal steps before `end_s`. */
function equalSteps(time_s: Float64Array, i: number, end_s: number): number {
  const step = time_s[i + 1] - time_s[i];
  let many = 1;
  while (time_s[i + many] < end_s && Math.abs(time_s[i + many] - time_s[i] - many * step) <= SAME_STEP * step)
    many++;
  return many;
}

/** Voltages of a run of equal steps, with the modes at its first time; leaves them at its last. */
function fillRun(
  modes: Modes,
  { start_s, current_A, slope }: Stretch,
  time_s: Float64Array,
  from: number,
  many: number,
  out: Float64Array,
): void {
  const { form } = modes;
  const step = many > 1 ? (time_s[from + many - 1] - time_s[from]) / (many - 1) : 0;
  for (let k = 0; k < many; k++)
    out[from + k] =
      -form.inductance_H * slope - form.dc_ohm * (current_A + slope * (time_s[from + k] - start_s));
  for (let m = 0; m < modes.count; m++) addMode(modes, m, step, slope, out.subarray(from, from + many));
}

const g = growthScratch();

/** Takes one mode's share off all points of a run, which begins at the mode's state, and leaves the mode at the last. */
function addMode(modes: Modes, m: number, step: number, slope: number, out: Float64Array): void {
  const { dRe, dIm } = modes;
  growth(modes.form.poleRe[m], modes.form.poleIm[m], step, g);
  const [eRe, eIm, lessRe] = g;
  const kRe = slope * (modes.cpRe[m] * lessRe - modes.cpIm[m] * eIm);
  const kIm = slope * (modes.cpRe[m] * eIm + modes.cpIm[m] * lessRe);
  let re = dRe[m];
  let im = dIm[m];
  out[0] -= re;
  for (let k = 1; k < out.length; k++) {
    const next = eRe * re - eIm * im + kRe;
    im = eRe * im + eIm * re + kIm;
    re = next;
    out[k] -= re;
    if (Math.abs(re) + Math.abs(im) < NOTHING) {
      re = 0;
      im = 0;
      if (slope === 0) break;
    }
  }
  dRe[m] = re;
  dIm[m] = im;
}
