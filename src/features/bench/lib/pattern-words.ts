import { worstSwing_V } from '@shared/rail/time';
import { formatQuantity } from '@shared/units/format';
import type { RailInTime } from '@workers/checks/checks.interface';

/** Above this Q a resonance rings on for long enough that swings add up (Q of 2: two thirds are left after half a period). */
const RINGS = 1;

/** Why a pattern of the load breaks the ripple though the curve stays under the target; null where there is nothing to say. */
export function whyPatternFails(
  { pattern, allowance_V }: Pick<RailInTime, 'pattern' | 'allowance_V'>,
  frequencyHolds: boolean | null,
): string | null {
  if (!pattern || allowance_V === null) return null;
  if (worstSwing_V(pattern) <= allowance_V) return null;
  const { dominant } = pattern;
  const peak =
    dominant && dominant.q > RINGS
      ? ` Most of it is the resonance at ${formatQuantity(dominant.frequency_Hz, 'Hz')} (Q ${dominant.q.toPrecision(2)}), which rings on from one edge to the next.`
      : ' Several resonances, each mild, add up from edge to edge.';
  const lead = frequencyHolds
    ? 'Holds over frequency, yet a pattern of the load exists that swings further than allowed: the target limits each frequency alone, not their sum.'
    : 'A pattern of the load exists that swings further than allowed.';
  return lead + peak;
}
