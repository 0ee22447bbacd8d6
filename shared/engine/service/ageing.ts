import { EngineError } from '../errors';
import { BASIS } from './basis';
import { notNegative } from './checks';
import { familyOf } from './family';
import type { Estimate, PartBehaviour } from './part-behaviour';

/** Catalogue values hold so long after the last heat: the usual referee time. */
export const REFERENCE_AGE_H = 1000;
/** The law has no start: younger than this counts as this, one hour after soldering. */
export const LEAST_AGE_H = 1;

/** Typical loss in % per decade of hours: X7R and X5R 2.5, Y5V 7; the ranges printed for Y5U and Z5U are 4 to 6. */
const CLASS_2_RATE = 2.5;
const MIDDLE_OF_U = 5;
const V_RATE = 7;

/**
 * C ÷ C(reference) of a ceramic of `age_h` hours since it was last hot: 1 − k·log₁₀(t/t_ref), linear in decades of hours and not
 * compounded; k in per cent per decade. Above 1 when younger than the reference. Ages below 1 h count as 1 h. Throws EngineError
 * for a negative age or rate, a reference that is not above zero, and an age at which nothing would be left.
 * Source: log-decade law, IEC 60384-9 / EIA-521 (1000 h reference).
 */
export function ageingFactor(
  percentPerDecade: number,
  age_h: number,
  reference_h: number = REFERENCE_AGE_H,
): number {
  const rate = notNegative('ageing_percent_per_decade', percentPerDecade) / 100;
  const age = Math.max(LEAST_AGE_H, notNegative('age_h', age_h));
  if (!(notNegative('reference_h', reference_h) > 0))
    throw new EngineError('reference_h', 'must be above zero');
  const factor = 1 - rate * Math.log10(age / reference_h);
  if (!(factor > 0)) throw new EngineError('age_h', 'at this age and rate no capacitance is left');
  return factor;
}

export interface AgeingRate {
  percentPerDecade: number;
  estimated: boolean;
  basis: string;
}

/** How fast a part ages: its own rate, or what is usual for its dielectric. Class 1 does not age, which is no estimate. */
export function ageingRate(
  part: Pick<PartBehaviour, 'ageing_percent_per_decade' | 'technology' | 'dielectric'>,
): AgeingRate {
  const own = part.ageing_percent_per_decade;
  if (own !== undefined) {
    notNegative('ageing_percent_per_decade', own);
    return { percentPerDecade: own, estimated: false, basis: BASIS.ownRate };
  }
  const family = familyOf(part);
  if (family.kind === 'bare') return { percentPerDecade: 0, estimated: false, basis: BASIS.asGiven };
  if (family.kind !== 'ceramic')
    return {
      percentPerDecade: 0,
      // The law is one of ferroelectric ceramics; electrolytic aluminium dries out instead, and by how much nobody has said.
      estimated: family.kind === 'aluminium',
      basis: BASIS.noAgeingLaw(family.kind),
    };
  const { dielectric } = family;
  if (!dielectric) return { percentPerDecade: CLASS_2_RATE, estimated: true, basis: BASIS.unknownDielectric };
  if (dielectric.class === 1)
    return { percentPerDecade: 0, estimated: false, basis: BASIS.noAgeing(dielectric.code) };
  const highRate = dielectric.lowest < -0.6 ? V_RATE : MIDDLE_OF_U;
  return {
    percentPerDecade: dielectric.class === 3 ? highRate : CLASS_2_RATE,
    estimated: true,
    basis: BASIS.usualRate(dielectric.code),
  };
}

/** A part's ageing factor after `age_h` hours; exactly 1, and no estimate, at the reference age. */
export function ageingEstimate(part: PartBehaviour, age_h: number): Estimate {
  const { percentPerDecade, estimated, basis } = ageingRate(part);
  const factor = ageingFactor(percentPerDecade, age_h);
  if (age_h === REFERENCE_AGE_H) return { factor: 1, estimated: false, basis: BASIS.atReferenceAge };
  return { factor, estimated, basis };
}
