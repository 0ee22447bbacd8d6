import type { Stretch } from './load-current';
import type { Modes } from './modes';
import { restOf } from './rate-limits';
import { RateModes } from './rate-modes';
import { sampleRates } from './rate-samples';
import { cubicTurn, zeroBetween } from './zero-between';

/** A place where the voltage turns. */
export interface TurningPoint {
  /** Seconds from the start of the stretch. */
  after_s: number;
  /** How far below its value without load the voltage is there, in volts. */
  fall_V: number;
}

export interface TurningPoints {
  points: TurningPoint[];
  /** How far the search came, in seconds; short of the stretch's length only where it ran out of steps. */
  until_s: number;
  /** How far down the voltage is there, and a bound on all its movement after that, in volts; 0 when nothing moves any more. */
  until_V: number;
  rest_V: number;
}

/** Steps after which is looked anew which modes still count. */
const BLOCK = 32;
/** Phase in rad that the fastest living mode may go through in a step: 24 steps a cycle. */
const PHASE = 0.26;

/**
 * All turning points of the voltage inside a stretch, given the modes at its start (they are left as they are). Its rate of
 * change is followed in steps that the fastest living mode asks for; where it changes sign, or the cubic through two neighbours
 * does, Newton's method finds the exact place. A mode that can move the voltage by no more than `least_V` from here on is dead.
 * `budget.steps` is counted down; at 0 the search ends.
 */
export function turningPoints(
  modes: Modes,
  stretch: Stretch,
  least_V: number,
  budget: { steps: number },
): TurningPoints {
  const { length_s } = stretch;
  const rates = new RateModes(modes, stretch);
  const points: TurningPoint[] = [];
  let now_s = 0;
  while (now_s < length_s && budget.steps > 0) {
    const fastest = rates.bury(least_V);
    if (fastest === 0) break;
    const left_s = length_s - now_s;
    const many = Math.min(BLOCK, Math.ceil((left_s * fastest) / PHASE));
    const step_s = Math.min(PHASE / fastest, left_s / many);
    for (const after_s of turnsInBlock(rates, step_s, many))
      points.push({ after_s: now_s + after_s, fall_V: rates.fall_V + rates.fallsBy(after_s) });
    rates.advance(many * step_s);
    budget.steps -= many;
    now_s = Math.min(length_s, now_s + many * step_s);
  }
  const isDone = now_s >= length_s || rates.bury(least_V) === 0;
  return {
    points,
    until_s: isDone ? length_s : now_s,
    until_V: rates.fall_V,
    rest_V: isDone ? 0 : restOf(rates),
  };
}

const rate = new Float64Array(BLOCK + 1);
const bend = new Float64Array(BLOCK + 1);

/** Where the rate passes zero within `many` steps. */
function turnsInBlock(rates: RateModes, step_s: number, many: number): number[] {
  sampleRates(rates, step_s, many, rate, bend);
  const found: number[] = [];
  const at = (t: number) => rates.at(t);
  for (let k = 0; k < many; k++) {
    const a = rate[k];
    const b = rate[k + 1];
    const low = k * step_s;
    const high = low + step_s;
    if ((a > 0 && b <= 0) || (a < 0 && b >= 0)) {
      found.push(zeroBetween(at, low, high, low + (step_s * a) / (a - b), a > 0));
    } else if (a * bend[k] < 0 && b * bend[k + 1] > 0 && a * b > 0) {
      // It comes near zero between the two and goes back: if it passes zero, then twice.
      const middle = low + step_s * cubicTurn(a, b, step_s * bend[k], step_s * bend[k + 1]);
      if (at(middle)[0] * a >= 0) continue;
      found.push(zeroBetween(at, low, middle, 0.5 * (low + middle), a > 0));
      found.push(zeroBetween(at, middle, high, 0.5 * (middle + high), a < 0));
    }
  }
  return found;
}
