import { conditionsOf } from '@shared/rail/conditions';
import { risesFrom_Hz, targetMask } from '@shared/rail/target-mask';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';

const q = (value: number, unit: 'A' | 's' | 'Hz' | 'Ω' | 'H' | 'F') =>
  formatQuantity(value, unit, { trim: true });

function sourceText({ source }: RailSpec): string {
  switch (source.kind) {
    case 'open':
      return 'none';
    case 'table':
      return `table, ${source.points.length} points`;
    case 'rl':
      return `${q(source.resistance_ohm, 'Ω')}+${q(source.inductance_H, 'H')}`;
    case 'damped':
      return `damped, ${q(source.inductance_H, 'H')}`;
  }
}

function levelText(
  ohm: number,
  rise: { rise_s?: number | undefined; rising_H?: number | undefined },
): string {
  const corner = risesFrom_Hz(ohm, rise);
  const level = formatQuantity(ohm, 'Ω');
  return corner === null ? level : `${level}, rising from ${q(corner, 'Hz')}`;
}

function targetText({ target, voltage_V }: RailSpec): string {
  switch (target.kind) {
    case 'flat':
      return levelText(target.impedance_ohm, target);
    case 'step':
      return levelText((voltage_V * target.ripple_percent) / 100 / target.step_A, target);
    case 'mask':
      return `mask, ${target.points.length} points`;
  }
}

/** `45 °C, 10 years`, with what was assumed said so. */
export function conditionsText(spec: Pick<RailSpec, 'conditions'>): string {
  const { conditions, assumed } = conditionsOf(spec);
  const years = conditions.age_h / HOURS_A_YEAR;
  const age =
    years < 0.5 ? `${Math.round(conditions.age_h)}\u00a0h` : `${Number(years.toPrecision(2))}\u00a0years`;
  return `${conditions.usual_C}\u00a0°C, ${age}${assumed ? ' (assumed)' : ''}`;
}

const HOURS_A_YEAR = 8766;

/** What stands in the margin of the bench: each fact of the rail in one line. */
export function specFacts(spec: RailSpec): [name: string, value: string][] {
  const facts: [string, string][] = [['rail', formatVolts(spec.voltage_V)]];
  if (spec.target.kind === 'step') {
    facts.push(['ripple', `${spec.target.ripple_percent}\u00a0%`]);
    const rise = spec.load_step ? ` / ${q(spec.load_step.rise_s, 's')}` : '';
    facts.push(['step', `${q(spec.target.step_A, 'A')}${rise}`]);
  }
  facts.push(['target', targetText(spec)]);
  facts.push(['band', `${q(spec.band_Hz[0], 'Hz')}–${q(spec.band_Hz[1], 'Hz')}`]);
  facts.push(['source', sourceText(spec)]);
  facts.push(['planes', spec.plane ? q(spec.plane.capacitance_F, 'F') : 'none']);
  if (spec.package) facts.push(['package', q(spec.package.inductance_H, 'H')]);
  facts.push(['seen at', spec.observe]);
  facts.push(['in service', conditionsText(spec)]);
  return facts;
}

/** Corners of the waterline over the band, for drawing. */
export function waterlinePoints(spec: RailSpec, targetAt: (f: number) => number): [number, number][] {
  const [low, high] = spec.band_Hz;
  const corners = Array.from(targetMask(spec).frequency_Hz).filter((f) => f > low && f < high);
  return [low, ...corners, high].map((f) => [f, targetAt(f)]);
}
