import { EngineError } from '../errors';
import type { Modes } from './modes';
import type { PoleForm } from './pole-form';

/**
 * A load current: straight between its corners [time in s, current in A], constant before the first and after the last. Times do not
 * fall; two corners at one time are a jump.
 */
export type LoadCurrent = readonly (readonly [time_s: number, current_A: number])[];

/** A stretch of time in which the load current is straight. */
export interface Stretch {
  start_s: number;
  /** Infinity for the last one. */
  length_s: number;
  /** Load current at the start, and its change per second. */
  current_A: number;
  slope: number;
}

/** The stretches from the first corner on; a jump shows as a current that differs from where the stretch before ended. */
export function stretchesOf(current: LoadCurrent): Stretch[] {
  const list: Stretch[] = [];
  current.forEach(([start_s, current_A], k) => {
    const next = current[k + 1];
    if (!next) list.push({ start_s, length_s: Number.POSITIVE_INFINITY, current_A, slope: 0 });
    else if (next[0] > start_s) {
      const length_s = next[0] - start_s;
      list.push({ start_s, length_s, current_A, slope: (next[1] - current_A) / length_s });
    }
  });
  return list;
}

/**
 * Goes through stretches, with the modes as they are at the start of each; before the first the load is `before_A` and all is
 * settled. `visit` may leave the modes as they were or advance them to the end of the stretch and then give true.
 */
export function walk(
  modes: Modes,
  before: number,
  stretches: readonly Stretch[],
  visit: (stretch: Stretch) => boolean,
): void {
  let before_A = before;
  for (const stretch of stretches) {
    const { length_s, current_A, slope } = stretch;
    if (current_A !== before_A) modes.jump(current_A - before_A);
    if (!visit(stretch) && Number.isFinite(length_s)) modes.advance(length_s, slope);
    before_A = current_A + (Number.isFinite(length_s) ? slope * length_s : 0);
  }
}

/** Throws EngineError naming `load` when the current has no corners, is not finite, goes back in time or jumps where it must not. */
export function checkCurrent(current: LoadCurrent, form: PoleForm): void {
  if (current.length === 0) throw new EngineError('load', 'the load current needs at least one corner');
  current.forEach(([time_s, current_A], k) => {
    if (!Number.isFinite(time_s) || !Number.isFinite(current_A))
      throw new EngineError(`load[${k}]`, 'time and current must be finite numbers');
    if (k === 0) return;
    const [earlier_s, earlier_A] = current[k - 1];
    if (time_s < earlier_s) throw new EngineError(`load[${k}]`, 'times must not fall');
    if (time_s === earlier_s && current_A !== earlier_A && form.inductance_H > 0)
      throw new EngineError(
        `load[${k}]`,
        'the current jumps, but every path of this rail has inductance: give the edge a rise time',
      );
  });
}
