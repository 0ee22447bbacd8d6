import { type Drawing, drawStretch, thinOut, withPoints } from './drawing';
import { type EdgeResponse, edgeOf } from './edge-response';
import { type LoadCurrent, stretchesOf, walk } from './load-current';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';
import { settlesAfter } from './rate-limits';
import { RateModes } from './rate-modes';
import { responseAt } from './response';
import { type Direction, LEAVE_OUT, type Switching, smoothed, worstSwitching } from './switching';

/** The load that drives the voltage furthest in one direction, and what the voltage then does. */
export interface PatternRun {
  /** No load between 0 and the step with such edges takes the voltage further from its value without load: volts, not negative. */
  bound_V: number;
  /** When the load is switched on and off; off before. Time 0 is the first edge. */
  edges: Switching;
  /** The load current that comes of it: straight between its corners, [s, A]. */
  corners: LoadCurrent;
  /** The voltage's difference from its value without load, below zero where it falls, at rising times: at most 8000. */
  time_s: Float64Array;
  deviation_V: Float64Array;
  /** How far the pattern takes the voltage in its direction, volts counted positive, and when. */
  simulated_V: number;
  simulated_time_s: number;
}

const MOST_POINTS = 8000;
/** How far a straight line between two points may be off, as a share of the bound. */
const CHORD = 2e-3;
/** Share of the total variation below which a bound is rounding. */
const NOTHING = 1e-9;
/** How much longer than to its extreme the pattern is shown. */
const SHOWN = 1.1;

const atRest = (): PatternRun => ({
  bound_V: 0,
  edges: [],
  corners: [[0, 0]],
  time_s: new Float64Array(1),
  deviation_V: new Float64Array(1),
  simulated_V: 0,
  simulated_time_s: 0,
});

/** Bound, pattern and its voltage in one direction, for a load of `step_A` whose edges take `rise_s`; see worst-pattern.ts. */
export function patternRun(
  form: PoleForm,
  edge: EdgeResponse,
  direction: Direction,
  step_A: number,
  rise_s: number,
): PatternRun {
  const sign = direction === 'fall' ? 1 : -1;
  const bound_V = 0.5 * step_A * (edge.variation_ohm + sign * form.dc_ohm);
  if (bound_V <= NOTHING * step_A * edge.variation_ohm) return atRest();
  const longest_s = settledAfter(form, rise_s, (0.1 * LEAVE_OUT * bound_V) / step_A);
  const { edges, peak_s } = worstSwitching(edge, direction, longest_s, rise_s, form.inductance_H > 0);
  const current = smoothed(edges, step_A, rise_s);
  const peak_V = responseAt(form, current, Float64Array.of(peak_s))[0];
  const drawn = drawn_V(form, current, SHOWN * peak_s + rise_s, CHORD * bound_V);
  const marked = withPoints(thinOut(drawn, MOST_POINTS - 1), [[peak_s, -peak_V]]);
  return {
    bound_V,
    edges,
    corners: current,
    time_s: Float64Array.from(marked.time_s),
    deviation_V: Float64Array.from(marked.fall_V, (fall_V) => 0 - fall_V),
    simulated_V: Math.max(0, -sign * peak_V),
    simulated_time_s: peak_s,
  };
}

/** Seconds from the start of an edge after which no mode is above `height_ohm` shared out among all. */
function settledAfter(form: PoleForm, rise_s: number, height_ohm: number): number {
  const modes = new Modes(form);
  let after_s = 0;
  walk(modes, 0, edgeOf(rise_s), (stretch) => {
    if (!Number.isFinite(stretch.length_s) && height_ohm > 0)
      after_s =
        stretch.start_s + settlesAfter(new RateModes(modes, stretch), height_ohm / Math.max(1, modes.count));
    return false;
  });
  return after_s;
}

function drawn_V(form: PoleForm, current: LoadCurrent, end_s: number, chord_V: number): Drawing {
  const drawing: Drawing = { time_s: [0], fall_V: [0] };
  const modes = new Modes(form);
  walk(modes, 0, stretchesOf(current), (stretch) => {
    const length_s = Math.min(stretch.length_s, end_s - stretch.start_s);
    if (length_s > 0) drawStretch(modes, { ...stretch, length_s }, length_s, chord_V, drawing);
    return false;
  });
  return drawing;
}
