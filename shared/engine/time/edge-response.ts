import { roughExcursion } from './excursion';
import { type Stretch, walk } from './load-current';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';
import { turningPoints } from './turning-points';

/** How the voltage falls after an edge of 1 A, as the ohms between its turns. */
export interface EdgeResponse {
  /**
   * Where it turns: seconds from the start of the edge, and ohms. Begins with 0 at time 0; each run from one to the next is
   * straight up or down. A jump is a run of no length. Ends with Z(0) at Infinity, unless the search ran out of steps.
   */
  turns: (readonly [after_s: number, fall_ohm: number])[];
  /** Total variation in ohm: all ways up and down together, an upper bound where the search ran out of steps. */
  variation_ohm: number;
}

/** What a mode must still be able to move to be followed, as a share of the largest excursion. */
const MATTERS = 1e-12;
/** Steps after which the rest is only bounded: 10 000 cycles of ringing. */
const SEARCH_STEPS = 250_000;

/** An edge of 1 A of `rise_s`, straight; 0 is a jump. */
export const edgeOf = (rise_s: number): Stretch[] => [
  ...(rise_s > 0 ? [{ start_s: 0, length_s: rise_s, current_A: 0, slope: 1 / rise_s }] : []),
  { start_s: rise_s, length_s: Number.POSITIVE_INFINITY, current_A: 1, slope: 0 },
];

/**
 * Turns and total variation of the response to an edge of 1 A that takes `rise_s`, its jumps included: where every path has
 * inductance L the edge begins and ends with a jump of L/rise_s, so it must take a time.
 */
export function edgeResponse(form: PoleForm, rise_s: number, steps = SEARCH_STEPS): EdgeResponse {
  const stretches = edgeOf(rise_s);
  const least_V = MATTERS * roughExcursion(form, 0, stretches);
  const modes = new Modes(form);
  const budget = { steps };
  const turns: [number, number][] = [[0, 0]];
  let rest_ohm = 0;
  walk(modes, 0, stretches, (stretch) => {
    add(turns, stretch.start_s, modes.fall(stretch.current_A, stretch.slope));
    const found = turningPoints(modes, stretch, least_V, budget);
    for (const { after_s, fall_V } of found.points) add(turns, stretch.start_s + after_s, fall_V);
    if (Number.isFinite(stretch.length_s)) {
      modes.advance(stretch.length_s, stretch.slope);
      add(turns, stretch.start_s + stretch.length_s, modes.fall(1, stretch.slope));
      return true;
    }
    rest_ohm = found.rest_V;
    if (found.until_s === Number.POSITIVE_INFINITY) add(turns, found.until_s, form.dc_ohm);
    else add(turns, stretch.start_s + found.until_s, found.until_V);
    return true;
  });
  const variation_ohm = turns.reduce(
    (sum, turn, i) => sum + (i > 0 ? Math.abs(turn[1] - turns[i - 1][1]) : 0),
    rest_ohm,
  );
  return { turns, variation_ohm };
}

/** Adds a turn; what lies on the way between two others is none. */
function add(turns: [number, number][], after_s: number, fall_ohm: number): void {
  const last = turns[turns.length - 1];
  if (fall_ohm === last[1]) return;
  const before = turns[turns.length - 2];
  if (before && last[1] > before[1] === fall_ohm > last[1]) turns.pop();
  turns.push([after_s, fall_ohm]);
}
