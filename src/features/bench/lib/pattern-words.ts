import { worstSwing_V } from '@shared/rail/time';
import { formatQuantity } from '@shared/units/format';
import type { RailInTime } from '@workers/checks/checks.interface';

/** Above this Q a resonance rings on for long enough that swings add up. */
const RINGS = 1;
/** A resonance with less of the whole than this is one among several. */
const MAIN_SHARE = 0.3;
/** One edge that is already so much of the swing is the cause, whatever rings besides. */
const EDGE_SHARE = 0.5;

type Told = Pick<RailInTime, 'pattern' | 'allowance_V' | 'edge_V' | 'load'>;

/** Why a pattern of the load breaks the ripple though the curve stays under the target; null where there is nothing to say. */
export function whyPatternFails(
  time: Told,
  frequencyHolds: boolean | null,
  band_Hz: readonly [number, number],
): string | null {
  const { pattern, allowance_V } = time;
  if (!pattern || allowance_V === null || worstSwing_V(pattern) <= allowance_V) return null;
  const { dominant } = pattern;
  const isMain = dominant !== null && dominant.share >= MAIN_SHARE && dominant.q > RINGS;
  const lead = frequencyHolds
    ? `Holds over ${isMain && dominant.frequency_Hz > band_Hz[1] ? 'its band' : 'frequency'}, yet a pattern of the load exists that swings further than allowed`
    : 'A pattern of the load exists that swings further than allowed';
  return `${lead}${causeOf(time, band_Hz, frequencyHolds === true)}`;
}

function causeOf(
  { pattern, edge_V, load }: Told,
  band_Hz: readonly [number, number],
  frequencyHolds: boolean,
): string {
  if (!pattern || !load) return '.';
  const { dominant } = pattern;
  if (edge_V > EDGE_SHARE * worstSwing_V(pattern))
    return `: one edge of ${formatQuantity(load.rise_s, 's', { trim: true })} alone drops ${formatQuantity(edge_V, 'V')} across the inductance that is left at high frequency (L·dI/dt).`;
  if (!dominant || dominant.share < MAIN_SHARE || dominant.q <= RINGS)
    return ': several resonances, each mild, add up from edge to edge.';
  const where = `the resonance at ${formatQuantity(dominant.frequency_Hz, 'Hz')} (Q ${dominant.q.toPrecision(2)})`;
  if (dominant.frequency_Hz > band_Hz[1])
    return `. Most of it is ${where}, beyond the band: the target asks nothing there, and it rings on from one edge to the next.`;
  const sum = frequencyHolds ? ': the target limits each frequency alone, not their sum' : '';
  return `${sum}. Most of it is ${where}, which rings on from one edge to the next.`;
}
