import { type Drawing, drawStretch, thinOut, withPoints } from './drawing';
import { roughExcursion } from './excursion';
import { Extremes } from './extremes';
import { type Stretch, walk } from './load-current';
import { checkStep, type LoadStepInput, stepStretches } from './load-step-input';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';
import { settlesAfter } from './rate-limits';
import { RateModes } from './rate-modes';
import { turningPoints } from './turning-points';

/** The rail's voltage in answer to a load step. Times in seconds from the start of the rise. */
export interface LoadStep {
  /** Rising from 0, at most 20 000, closer where something happens; among them the times of droop and overshoot. */
  time_s: Float64Array;
  voltage_V: Float64Array;
  /** Before the step, and at last after it. */
  settled_V: number;
  /** Largest fall below and largest rise above the settled voltage, both counted positive; 0 at time 0 when there is none. */
  droop_V: number;
  droop_time_s: number;
  overshoot_V: number;
  overshoot_time_s: number;
}

const MOST_POINTS = 20_000;
/** How far a straight line between two points may be off, as a share of the largest excursion. */
const CHORD = 4e-4;
/** All has settled when every mode is below this share of the largest excursion. */
const SETTLED = 1e-4;
/** What a mode must still be able to move to matter for the extremes, as a share of the largest excursion. */
const MATTERS = 1e-7;
/** Search steps for extremes in each stretch: 6000 cycles of ringing. */
const SEARCH_STEPS = 150_000;

/**
 * The voltage of a rail whose source holds `voltage_V` while the load steps up and back. Curve and extremes are exact: each
 * value is the closed form of modes.ts, each extreme a zero of its rate of change, not the best of some points.
 * Throws EngineError naming the field of `load_step` that is not finite, negative, or zero where it must not be.
 */
export function loadStep(form: PoleForm, step: LoadStepInput, voltage_V: number): LoadStep {
  checkStep(step, voltage_V);
  const end_s = step.end_s ?? Number.POSITIVE_INFINITY;
  const stretches = stepStretches(step);
  const scale_V = Math.max(roughExcursion(form, step.before_A, stretches), Number.MIN_VALUE);
  const settled_V = form.dc_ohm * step.before_A;
  const modes = new Modes(form);
  const drawing: Drawing = { time_s: [0], fall_V: [settled_V] };
  const extremes = new Extremes(settled_V);
  walk(modes, step.before_A, stretches, (stretch) => {
    if (stretch.start_s >= end_s) return false;
    const rates = new RateModes(modes, stretch);
    const settled_s = settlesAfter(rates, SETTLED * scale_V);
    const length_s = Math.min(stretch.length_s, end_s - stretch.start_s);
    const until_s = Number.isFinite(length_s) ? length_s : settled_s;
    const part: Stretch = { ...stretch, length_s };
    extremes.see(stretch.start_s, rates.fall_V);
    for (const { after_s, fall_V } of turningPoints(modes, part, MATTERS * scale_V, { steps: SEARCH_STEPS })
      .points)
      extremes.see(stretch.start_s + after_s, fall_V);
    if (Number.isFinite(length_s))
      extremes.see(stretch.start_s + length_s, rates.fall_V + rates.fallsBy(length_s));
    drawStretch(modes, part, until_s, CHORD * scale_V, drawing);
    return false;
  });
  const { lowest, highest } = extremes;
  const marked = withPoints(thinOut(drawing, MOST_POINTS - 2), [lowest, highest]);
  return {
    time_s: Float64Array.from(marked.time_s),
    voltage_V: Float64Array.from(marked.fall_V, (fall_V) => voltage_V - fall_V),
    settled_V: voltage_V - settled_V,
    droop_V: lowest[1] - settled_V,
    droop_time_s: lowest[0],
    overshoot_V: settled_V - highest[1],
    overshoot_time_s: highest[0],
  };
}
