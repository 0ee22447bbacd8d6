import { worstSwing_V } from '@shared/rail/time';
import type { RailInTime, RailVerdicts } from '@workers/checks/checks.interface';

/** What does not hold beside the curve that is looked at, in words, so that no green figure stands alone. */
export function failingChecks(verdicts: RailVerdicts | null, time: RailInTime | null): string[] {
  const failing: string[] = [];
  if (verdicts) {
    if (!verdicts.service.holds) failing.push('in service');
    if (verdicts.corners.some((one) => !one.holds)) failing.push('worst case');
    if (verdicts.missing.some((one) => !one.holds)) failing.push('one part open');
  }
  if (time) {
    const { step, worst_step, pattern, allowance_V, start_up } = time;
    const over = (value_V: number) => allowance_V !== null && value_V > allowance_V;
    if (step && over(Math.max(step.droop_V, step.overshoot_V))) failing.push('load step');
    else if (worst_step && over(Math.max(worst_step.droop_V, worst_step.overshoot_V)))
      failing.push('load step in the worst corner');
    if (pattern && over(worstSwing_V(pattern))) failing.push('worst pattern');
    if (start_up.holds === false) failing.push('inrush');
  }
  return failing;
}
