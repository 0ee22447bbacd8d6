import type { NoiseBudget } from '@shared/schemas/rail-spec.schema';
import { budgetFigures, isSpent, overspentText } from './budget';
import type { SpecReader } from './spec-reader';

/** What the rail's tolerance is spent on; null where the form has no budget. */
export function readBudget(reader: SpecReader): NoiseBudget | null {
  if (reader.form.budgetKind === 'none') return null;
  return {
    tolerance_percent: reader.quantity('tolerance', '%'),
    setpoint_percent: reader.quantityOrZero('setpoint', '%'),
    dc_drop_V: reader.quantityOrZero('dcDrop', 'V'),
    regulator_ripple_V: reader.quantityOrZero('regulatorRipple', 'V'),
  };
}

/** What a budget leaves in per cent; where nothing is left that is said at the tolerance, and the answer is no number. */
export function rippleFromBudget_percent(reader: SpecReader, budget: NoiseBudget, voltage_V: number): number {
  if (!(voltage_V > 0)) return Number.NaN;
  const figures = budgetFigures(budget, voltage_V);
  if (!isSpent(figures)) return figures.left.percent;
  if (budget.tolerance_percent > 0) reader.fault('tolerance', overspentText(figures));
  return Number.NaN;
}
