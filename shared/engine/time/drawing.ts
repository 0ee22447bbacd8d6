import type { Stretch } from './load-current';
import type { Modes } from './modes';
import { drawingStep } from './rate-limits';
import { RateModes } from './rate-modes';
import { sampleFall } from './rate-samples';

/** Points to be drawn: time in s, how far below its value without load the voltage is in volts. */
export interface Drawing {
  time_s: number[];
  fall_V: number[];
}

const BLOCK = 32;
/** Phase in rad that a visible mode goes through between two points: 16 points a cycle. */
const PHASE = 0.39;
/** A mode of this share of what a line may be off need not be followed. */
const UNSEEN = 0.25;
/** Points in one stretch and in all after which ringing is no longer followed, and what share of the stretch a step then takes. */
const MOST_IN_STRETCH = 150_000;
const MOST_IN_ALL = 600_000;
const coarsest = (all: number, before: number): number =>
  all > MOST_IN_ALL ? 1 / 8 : all - before > MOST_IN_STRETCH ? 1e-3 : 0;

/**
 * Adds points of a stretch to a drawing, from its start to `until_s` after it, so close that a straight line between two is off by no
 * more than `chord_V`. Where the voltage jumps at the start, a point follows right after the jump: times always rise.
 */
export function drawStretch(
  modes: Modes,
  stretch: Stretch,
  until_s: number,
  chord_V: number,
  drawing: Drawing,
): void {
  const rates = new RateModes(modes, stretch);
  const fall = new Float64Array(BLOCK + 1);
  const { time_s, fall_V } = drawing;
  const put = (after_s: number, value_V: number) => {
    const time = stretch.start_s + after_s;
    if (time_s.length > 0 && time <= time_s[time_s.length - 1]) return;
    time_s.push(time);
    fall_V.push(value_V);
  };
  const before = time_s.length;
  const jump_V = Math.abs(rates.fall_V - (fall_V[fall_V.length - 1] ?? Number.POSITIVE_INFINITY));
  let now_s = 0;
  while (now_s < until_s) {
    rates.bury(1e-3 * chord_V);
    const left_s = until_s - now_s;
    const wanted_s = drawingStep(rates, UNSEEN * chord_V, chord_V, PHASE);
    const finest_s = Math.min(left_s, Math.max(wanted_s, until_s * coarsest(time_s.length, before)));
    if (now_s === 0 && jump_V > chord_V) put(1e-3 * finest_s, rates.fall_V + rates.fallsBy(1e-3 * finest_s));
    const many = Math.min(BLOCK, Math.ceil(left_s / finest_s));
    const step_s = Math.min(finest_s, left_s / many);
    sampleFall(rates, step_s, many, fall);
    for (let k = 0; k <= many; k++) put(now_s + k * step_s, fall[k]);
    rates.advance(many * step_s);
    now_s = many * step_s >= left_s ? until_s : now_s + many * step_s;
  }
}

/** The drawing with at most `most` points, at least 4: of each run of points the lowest and the highest, so that no swing is lost. */
export function thinOut({ time_s, fall_V }: Drawing, most: number): Drawing {
  const n = time_s.length;
  if (n <= most) return { time_s, fall_V };
  const runs = Math.floor((most - 2) / 2);
  const kept = [0];
  for (let run = 0; run < runs; run++) {
    const from = 1 + Math.floor((run * (n - 2)) / runs);
    const to = 1 + Math.floor(((run + 1) * (n - 2)) / runs);
    let low = from;
    let high = from;
    for (let i = from; i < to; i++) {
      if (fall_V[i] < fall_V[low]) low = i;
      if (fall_V[i] > fall_V[high]) high = i;
    }
    kept.push(Math.min(low, high));
    if (low !== high) kept.push(Math.max(low, high));
  }
  kept.push(n - 1);
  return { time_s: kept.map((i) => time_s[i]), fall_V: kept.map((i) => fall_V[i]) };
}

/** Puts single points, such as exact extrema, between the others, or in place of one at the same time. */
export function withPoints(
  drawing: Drawing,
  more: readonly (readonly [time_s: number, fall_V: number])[],
): Drawing {
  const rows = [...drawing.time_s.map((time, i) => [time, drawing.fall_V[i]] as const), ...more];
  rows.sort((a, b) => a[0] - b[0]);
  const kept = rows.filter((row, i) => i + 1 === rows.length || row[0] < rows[i + 1][0]);
  return { time_s: kept.map((row) => row[0]), fall_V: kept.map((row) => row[1]) };
}
