import { BASIS } from './basis';
import { caseLength_mm } from './case-size';
import type { DielectricLimits } from './dielectric';
import type { Estimate } from './part-behaviour';

/** How steeply a middle case (0603) of class 2 falls: 71 % left at half the rating, 38 % at the rating. */
const MIDDLE_STEEPNESS = 1.6;
const MIDDLE_LENGTH_MM = 1.6;
/** Y5V and its like fall about as far at half the rating as class 2 does at the whole. */
const CLASS_3_STEEPER = 4;

/**
 * What a class 2 ceramic keeps at `ratio` = V ÷ V rated when nothing is known but its case: 1/(1 + a·ratio²), where a is 1.6 for
 * a middle case, rises as 1/√length for smaller ones and falls for larger ones. Common practice, not a law: a smooth form
 * without a source of its own whose a lies inside the figures of a vendor's page on derating (10 V part: 80–90 % left at 3.3 V,
 * 60–80 % at 5 V, 30–50 % at 10 V; 16 V part: 85–95 % at 5 V; smaller cases lose more). Real parts differ by tens of per cent.
 */
export function estimatedBias(
  ratio: number,
  caseCode: string | undefined,
  dielectric: DielectricLimits | null,
): Estimate {
  const length = caseLength_mm(caseCode);
  const a =
    MIDDLE_STEEPNESS *
    Math.sqrt(MIDDLE_LENGTH_MM / (length ?? MIDDLE_LENGTH_MM)) *
    (dielectric?.class === 3 ? CLASS_3_STEEPER : 1);
  return {
    factor: 1 / (1 + a * ratio * ratio),
    estimated: true,
    basis: BASIS.biasEstimate(length !== null, dielectric?.code ?? null),
  };
}
