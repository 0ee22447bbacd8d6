import { targetFromStep } from '@shared/engine/target';
import { conditionsOf } from '@shared/rail/conditions';
import { risesFrom_Hz } from '@shared/rail/target-mask';
import {
  type RailSpec,
  rippleLeft_percent,
  type Source,
  type Target,
} from '@shared/schemas/rail-spec.schema';
import { formatLength, formatQuantity, formatVolts, MINUS } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';

const q = (value: number, unit: UnitSymbol) => formatQuantity(value, unit, { trim: true });
const plus = (...terms: (string | false)[]) => terms.filter(Boolean).join(' + ');

type Level = Exclude<Target, { kind: 'mask' }>;

function levelText(ohm: number, target: Level): string {
  const corner = risesFrom_Hz(ohm, target);
  const level = formatQuantity(ohm, 'Ω');
  if (corner === null) return level;
  const why =
    target.rise_s !== undefined ? `rise time ${q(target.rise_s, 's')}` : `as ${q(target.rising_H ?? 0, 'H')}`;
  return `${level} up to ${formatQuantity(corner, 'Hz')}, then 20 dB a decade (${why})`;
}

function targetRows({ target, voltage_V }: RailSpec): [string, string][] {
  switch (target.kind) {
    case 'flat':
      return [['target', levelText(target.impedance_ohm, target)]];
    case 'step':
      return [
        ['ripple', q(target.ripple_percent, '%')],
        ['load step', q(target.step_A, 'A')],
        ['target', levelText(targetFromStep(voltage_V, target.ripple_percent, target.step_A), target)],
      ];
    case 'mask':
      return [['target', target.points.map(([f, z]) => `${q(z, 'Ω')} at ${q(f, 'Hz')}`).join(', then ')]];
  }
}

/** What the tolerance is spent on, and what that leaves for the bank. */
function budgetRows({ noise_budget: budget, voltage_V }: RailSpec): [string, string][] {
  if (!budget) return [];
  const spent = [
    budget.setpoint_percent > 0 && `${q(budget.setpoint_percent, '%')} set-point error`,
    budget.dc_drop_V > 0 && `${q(budget.dc_drop_V, 'V')} DC drop`,
    budget.regulator_ripple_V > 0 && `${q(budget.regulator_ripple_V, 'V')} regulator ripple`,
  ].filter((one) => one !== false);
  const left = rippleLeft_percent(budget, voltage_V);
  const sum = [`±${q(budget.tolerance_percent, '%')}`, ...spent].join(` ${MINUS} `);
  return [['budget', `${sum} → ${q(left, '%')} for the bank`]];
}

function sourceText(source: Source): string {
  switch (source.kind) {
    case 'open':
      return 'none';
    case 'table':
      return `table of ${source.points.length} points`;
    case 'rl':
      return plus(
        source.resistance_ohm > 0 && q(source.resistance_ohm, 'Ω'),
        source.inductance_H > 0 && q(source.inductance_H, 'H'),
      );
    case 'damped': {
      const coil = plus(
        source.inductor_resistance_ohm > 0 && q(source.inductor_resistance_ohm, 'Ω'),
        q(source.inductance_H, 'H'),
      );
      const damping = plus(
        q(source.damping_ohm, 'Ω'),
        source.damping_inductance_H > 0 && q(source.damping_inductance_H, 'H'),
      );
      return plus(
        source.series_resistance_ohm > 0 && q(source.series_resistance_ohm, 'Ω'),
        source.series_inductance_H > 0 && q(source.series_inductance_H, 'H'),
        `((${coil}) ∥ (${damping}))`,
      );
    }
  }
}

function planeText({ plane }: RailSpec): string {
  if (!plane) return 'not described';
  const size = plane.geometry
    ? `, ${formatLength(plane.geometry.length_m)} × ${formatLength(plane.geometry.width_m)}, ${formatLength(plane.geometry.spacing_m)} apart`
    : '';
  const layers = plane.geometry?.pair ? `, layers ${plane.geometry.pair.join(' and ')}` : '';
  return `${q(plane.capacitance_F, 'F')}${size}${layers}`;
}

function packageRows({ package: pack }: RailSpec): [string, string][] {
  if (!pack) return [];
  const rows: [string, string][] = [
    ['package', `${q(pack.resistance_ohm, 'Ω')} + ${q(pack.inductance_H, 'H')}`],
  ];
  if (pack.die_capacitance_F > 0)
    rows.push(['die', `${q(pack.die_capacitance_F, 'F')} + ${q(pack.die_resistance_ohm, 'Ω')}`]);
  return rows;
}

function stepRows({ load_step: step }: RailSpec): [string, string][] {
  return step
    ? [['step shape', `${q(step.before_A, 'A')} + ${q(step.step_A, 'A')} in ${q(step.rise_s, 's')}`]]
    : [];
}

function startRows({ start_up: start }: RailSpec): [string, string][] {
  return start
    ? [['start-up', `${q(start.soft_start_s, 's')} soft start, limit ${q(start.current_limit_A, 'A')}`]]
    : [];
}

const celsius = (value: number): string => `${String(value).replace('-', MINUS)}\u00a0°C`;
/** Mean year of the calendar: 10 years are 87 660 h. */
const HOURS_A_YEAR = 8766;

function ageText(age_h: number): string {
  const years = Number((age_h / HOURS_A_YEAR).toPrecision(3));
  if (years < 0.5) return `${Math.round(age_h)}\u00a0h`;
  return `${years}\u00a0${years === 1 ? 'year' : 'years'}`;
}

const TOLERANCES = { capacitance: 'C', esr: 'ESR', esl: 'ESL' } as const;

/** Temperatures, age and which tolerances vary; what was assumed is said to be. */
function conditionsText(spec: RailSpec): string {
  const { conditions, assumed } = conditionsOf(spec);
  const { coldest_C, usual_C, hottest_C, age_h, vary } = conditions;
  const ends =
    vary.length === 0
      ? 'no tolerance at its ends'
      : `${vary.map((one) => TOLERANCES[one]).join(', ')} at their ends`;
  return `${celsius(coldest_C)} to ${celsius(hottest_C)}, usually ${celsius(usual_C)}; ${ageText(age_h)}; ${ends}${assumed ? ' (assumed)' : ''}`;
}

/** A rail's specification in words and figures, as rows of label and value. */
export function specFacts(spec: RailSpec): [string, string][] {
  return [
    ['rail', formatVolts(spec.voltage_V)],
    ...targetRows(spec),
    ...budgetRows(spec),
    ['band', `${q(spec.band_Hz[0], 'Hz')} – ${q(spec.band_Hz[1], 'Hz')}`],
    ['source', sourceText(spec.source)],
    ['plane', planeText(spec)],
    ...packageRows(spec),
    ['seen at', spec.observe],
    ...stepRows(spec),
    ...startRows(spec),
    ['conditions', conditionsText(spec)],
  ];
}
