import { type NoiseBudget, rippleLeft_percent } from '@shared/schemas/rail-spec.schema';
import { formatQuantity } from '@shared/units/format';

export type SpentOn = 'setpoint' | 'drop' | 'regulator';

/** Part of a rail's tolerance. */
export interface Share {
  volts: number;
  percent: number;
}

/** A noise budget added up. `left` below zero: overspent by as much. */
export interface BudgetFigures {
  tolerance: Share;
  spent: Record<SpentOn, Share>;
  left: Share;
}

export function budgetFigures(budget: NoiseBudget, voltage_V: number): BudgetFigures {
  const ofPercent = (percent: number): Share => ({ percent, volts: (percent / 100) * voltage_V });
  const ofVolts = (volts: number): Share => ({ volts, percent: (100 * volts) / voltage_V });
  return {
    tolerance: ofPercent(budget.tolerance_percent),
    spent: {
      setpoint: ofPercent(budget.setpoint_percent),
      drop: ofVolts(budget.dc_drop_V),
      regulator: ofVolts(budget.regulator_ripple_V),
    },
    left: ofPercent(rippleLeft_percent(budget, voltage_V)),
  };
}

/** What is smaller than this part of a rail's tolerance is rounding. */
const ROUNDING = 1e-9;

/** True when nothing is left for the bank. */
export const isSpent = ({ tolerance, left }: BudgetFigures): boolean =>
  left.percent <= ROUNDING * tolerance.percent;

/** Why a budget that leaves nothing is refused. */
export function overspentText({ tolerance, left }: BudgetFigures): string {
  if (left.percent >= -ROUNDING * tolerance.percent)
    return 'nothing is left for the bank: the tolerance is spent';
  return `nothing is left for the bank: overspent by ${shareText({ volts: -left.volts, percent: -left.percent })}`;
}

/** `63 mV (3.5 %)`. */
export const shareText = ({ volts, percent }: Share): string =>
  `${formatQuantity(volts, 'V', { trim: true })} (${formatQuantity(percent, '%', { trim: true })})`;
