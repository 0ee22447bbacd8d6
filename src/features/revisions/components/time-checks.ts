import type { RailChecks } from '@shared/schemas/checks.schema';
import { formatQuantity } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';

export interface Check {
  name: string;
  /** null: nothing to hold it against. */
  holds: boolean | null;
  figure: string;
  note: string;
}

type Against = (value_V: number) => Omit<Check, 'name'>;

const q = (value: number, unit: UnitSymbol) => formatQuantity(value, unit, { trim: true });

/** What the load does in the step that was tried: `0 A + 2 A in 10 ns`. */
function shapeText({ load, load_assumed }: RailChecks): string {
  if (!load) return '';
  const shape = `${q(load.before_A, 'A')} + ${q(load.step_A, 'A')} in ${q(load.rise_s, 's')}, back in ${q(load.fall_s, 's')} after ${q(load.hold_s, 's')}`;
  return `; ${shape}${load_assumed ? ' (assumed)' : ''}`;
}

const approximatedText = ({ approximated }: RailChecks): string =>
  approximated.length > 0 ? `; ≈ in time taken as series R–L–C: ${approximated.join(', ')}` : '';

/** The load step in service, and in the corner that takes it furthest. */
export function stepRows(checks: RailChecks, against: Against): Check[] {
  const { step, worst_step: worst } = checks;
  if (!step) return [];
  const row = (name: string, value_V: number, more: string): Check => {
    const one = against(value_V);
    return { name, ...one, note: one.note + more };
  };
  const said = shapeText(checks) + approximatedText(checks);
  const rows = [
    row('load step, droop', step.droop_V, said),
    row('load step, overshoot', step.overshoot_V, said),
  ];
  if (worst) {
    const isDroop = worst.droop_V >= worst.overshoot_V;
    const most = isDroop ? worst.droop_V : worst.overshoot_V;
    rows.push(row('load step, worst corner', most, `; ${isDroop ? 'droop' : 'overshoot'}, ${worst.corner}`));
  }
  return rows;
}

/** The soft start that would keep an inrush within its limit, where it is over it. */
export const neededText = ({ holds, needed_s }: RailChecks['start_up']): string =>
  holds === false && needed_s !== null
    ? `; a soft start of ${formatQuantity(needed_s, 's')} would keep within it`
    : '';
