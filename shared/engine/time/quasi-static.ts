import { EngineError } from '../errors';
import type { PoleForm } from './pole-form';

/**
 * The same rail without its resonances above `limit_Hz`: each is replaced by what it is far below itself, r/(s − p) ≈ −r/p − s·r/p²,
 * a resistance and an inductance in series (mode truncation with static correction, textbook modal analysis). Z(0) stays as it is;
 * below a fifth of the limit |Z| is off by less than (f/limit)², relative to what the left-out modes carry.
 *
 * For questions about any load at all: a lumped network of planes and vias rings without loss far above the band, where neither
 * the network nor the load's spectrum mean anything, and a pattern that plays on such a ring has no bound worth the name.
 * Throws EngineError for a limit that is not above zero.
 */
export function quasiStaticAbove(form: PoleForm, limit_Hz: number): PoleForm {
  if (!(limit_Hz > 0)) throw new EngineError('band_Hz', 'the limit must be above 0 Hz');
  const limit = 2 * Math.PI * limit_Hz;
  const keep: number[] = [];
  let { resistance_ohm, inductance_H } = form;
  for (let i = 0; i < form.poleRe.length; i++) {
    const [pr, pi, rr, ri] = [form.poleRe[i], form.poleIm[i], form.residueRe[i], form.residueIm[i]];
    const p2 = pr * pr + pi * pi;
    if (p2 <= limit * limit) {
      keep.push(i);
      continue;
    }
    const twice = pi === 0 ? 1 : 2;
    // Re(r/p) and Re(r/p²)
    const overP = (rr * pr + ri * pi) / p2;
    const overP2 = (rr * (pr * pr - pi * pi) + 2 * ri * pr * pi) / (p2 * p2);
    resistance_ohm -= twice * overP;
    inductance_H -= twice * overP2;
  }
  const pick = (list: Float64Array) => Float64Array.from(keep, (i) => list[i]);
  return {
    ...form,
    // Rounding, or a capacitance that outweighs all inductance up there: no inductance is left to speak of.
    inductance_H: Math.max(0, inductance_H),
    resistance_ohm,
    poleRe: pick(form.poleRe),
    poleIm: pick(form.poleIm),
    residueRe: pick(form.residueRe),
    residueIm: pick(form.residueIm),
  };
}
