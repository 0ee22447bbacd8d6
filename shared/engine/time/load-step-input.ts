import { EngineError } from '../errors';
import type { Stretch } from './load-current';

/** A load that steps up and back: straight edges of `rise_s` and `fall_s`, `hold_s` apart. */
export interface LoadStepInput {
  before_A: number;
  step_A: number;
  rise_s: number;
  hold_s: number;
  fall_s: number;
  /** Where the result ends, from the start of the rise; if left out, when all has settled. */
  end_s?: number;
}

/** A load step's stretches: rise, hold, fall and what comes after. */
export function stepStretches({ before_A, step_A, rise_s, hold_s, fall_s }: LoadStepInput): Stretch[] {
  const high_A = before_A + step_A;
  const end_s = rise_s + hold_s + fall_s;
  return [
    { start_s: 0, length_s: rise_s, current_A: before_A, slope: step_A / rise_s },
    { start_s: rise_s, length_s: hold_s, current_A: high_A, slope: 0 },
    { start_s: rise_s + hold_s, length_s: fall_s, current_A: high_A, slope: -step_A / fall_s },
    { start_s: end_s, length_s: Number.POSITIVE_INFINITY, current_A: before_A, slope: 0 },
  ];
}

/** Throws EngineError naming the field of `load_step` that is not finite, negative, or zero where it must not be. */
export function checkStep(step: LoadStepInput, voltage_V: number): void {
  if (!Number.isFinite(voltage_V)) throw new EngineError('voltage_V', 'voltage must be a finite number');
  const { before_A, end_s, ...above } = step;
  if (!(before_A >= 0) || !Number.isFinite(before_A))
    throw new EngineError('load_step.before_A', 'must be a finite number and not negative');
  for (const [name, value] of Object.entries(end_s === undefined ? above : { ...above, end_s }))
    if (!(value > 0) || !Number.isFinite(value))
      throw new EngineError(`load_step.${name}`, 'must be above zero and finite');
}
