import { targetFromStep } from '@shared/engine/target';
import { risesFrom_Hz } from '@shared/rail/target-mask';
import type { Target } from '@shared/schemas/rail-spec.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { isSpent, shareText } from './budget';
import { liveBand, liveBudget, liveTarget } from './live';
import type { SpecForm } from './spec-form';

const q = (value: number, unit: UnitSymbol) => formatQuantity(value, unit, { trim: true });
type Band = readonly [number, number] | null;
type Level = Exclude<Target, { kind: 'mask' }>;

/** What the target comes to while one types: `3 % of 0.9 V at 9 A → 3.00 mΩ`. Empty until it can be said. */
export function targetSentence(form: SpecForm): string {
  const live = liveTarget(form);
  if (!live) return '';
  const { target, voltage_V } = live;
  const band = liveBand(form);
  switch (target.kind) {
    case 'step': {
      const ohm = targetFromStep(voltage_V, target.ripple_percent, target.step_A);
      return `${q(target.ripple_percent, '%')} of ${formatVolts(voltage_V)} at ${q(target.step_A, 'A')} → ${levelText(ohm, target, band)}`;
    }
    case 'flat':
      return form.riseKind === 'level' ? '' : levelText(target.impedance_ohm, target, band);
    case 'mask':
      return maskText(target.points, band);
  }
}

/** What a budget leaves to a target that names no ripple itself; a step's target has it in its own sentence. */
export function budgetSentence(form: SpecForm): string {
  const figures = form.targetKind === 'step' ? null : liveBudget(form);
  return figures && !isSpent(figures) ? `the rail may move by ${shareText(figures.left)} under its load` : '';
}

/** `8.50 mΩ up to 31.8 MHz, then 20 dB a decade`. */
function levelText(ohm: number, rise: Level, band: Band): string {
  const level = formatQuantity(ohm, 'Ω');
  const corner = risesFrom_Hz(ohm, rise);
  if (corner === null) return level;
  const text = `${level} up to ${formatQuantity(corner, 'Hz')}, then 20 dB a decade`;
  if (band && corner >= band[1]) return `${text}: only beyond the band, level all over it`;
  return band && corner <= band[0] ? `${text}: it rises over the whole band` : text;
}

/** A mask with its ends; where the band goes further, how it goes on there. */
function maskText(points: readonly (readonly [number, number])[], band: Band): string {
  const [first, last] = [points[0], points[points.length - 1]];
  if (points.length === 1) return `1 point: level at ${formatQuantity(first[1], 'Ω')} over the whole band`;
  const text = `${points.length} points, ${q(first[0], 'Hz')} to ${q(last[0], 'Hz')}`;
  if (!band) return text;
  const beyond = [
    band[0] < first[0] && `below ${q(first[0], 'Hz')} at ${formatQuantity(first[1], 'Ω')}`,
    band[1] > last[0] && `above ${q(last[0], 'Hz')} at ${formatQuantity(last[1], 'Ω')}`,
  ].filter(Boolean);
  return beyond.length === 0
    ? text
    : `${text}; narrower than the band, it goes on level ${beyond.join(' and ')}`;
}
