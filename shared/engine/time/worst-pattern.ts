import { EngineError } from '../errors';
import { type DominantResonance, dominantResonance } from './dominant';
import { edgeResponse } from './edge-response';
import { type PatternRun, patternRun } from './pattern-run';
import type { PoleForm } from './pole-form';

/** The worst that a load can do, both ways. */
export interface WorstPattern {
  /** Furthest down and furthest up. */
  fall: PatternRun;
  rise: PatternRun;
  /** Total variation of the response to an edge of 1 A, in ohm. */
  variation_ohm: number;
  /** Z(0) in ohm. */
  dc_ohm: number;
  /** The resonance of |Z| that adds most to the bound. */
  dominant: DominantResonance | null;
}

/**
 * The worst that a load between 0 and `step_A` can do to the rail, however it is switched. The load is a 0/1 signal u averaged over the
 * last `rise_s`, so the voltage falls by step_A·∫ h(τ)·u(t − τ) dτ, where h = g′ and g is the response to one straight edge of that
 * length. As 0 ≤ u ≤ 1 that is at most step_A·∫ max(h, 0) = step_A·(TV + Z(0))/2 and at least −step_A·(TV − Z(0))/2, TV = ∫ |h| the total
 * variation of g with its jumps (peak gain: S. Boyd, C. Barratt, Linear Controller Design, 1991, section 5.2.5). The average over
 * a box takes each u to a load that is allowed and leaves 0 ≤ u ≤ 1 the only condition, so the bound stays exact for edges of any
 * length; it is reached by u = 1 where h(t − τ) > 0: the turns of g, timed backwards. The patterns given do that, short of swings
 * too small to matter, and their voltage is computed on its own from the load current.
 * Throws EngineError naming `load_step.step_A` or `load_step.rise_s`; 0 for the latter is allowed where the rail has a path
 * without inductance.
 */
export function worstPattern(form: PoleForm, load: { step_A: number; rise_s: number }): WorstPattern {
  const { step_A, rise_s } = load;
  if (!(step_A > 0) || !Number.isFinite(step_A))
    throw new EngineError('load_step.step_A', 'must be above zero and finite');
  if (!(rise_s >= 0) || !Number.isFinite(rise_s))
    throw new EngineError('load_step.rise_s', 'must be a finite number and not negative');
  if (rise_s === 0 && form.inductance_H > 0)
    throw new EngineError(
      'load_step.rise_s',
      'every path of this rail has inductance: an edge without rise time would need an infinite voltage',
    );
  const edge = edgeResponse(form, rise_s);
  return {
    fall: patternRun(form, edge, 'fall', step_A, rise_s),
    rise: patternRun(form, edge, 'rise', step_A, rise_s),
    variation_ohm: edge.variation_ohm,
    dc_ohm: form.dc_ohm,
    dominant: dominantResonance(form, rise_s),
  };
}
