import { targetFromStep } from '@shared/engine/target';
import type { RailSpec, Source } from '@shared/schemas/rail-spec.schema';
import { formatLength, formatQuantity, formatVolts } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';

const q = (value: number, unit: UnitSymbol) => formatQuantity(value, unit, { trim: true });
const plus = (...terms: (string | false)[]) => terms.filter(Boolean).join(' + ');

function targetRows({ target, voltage_V }: RailSpec): [string, string][] {
  switch (target.kind) {
    case 'flat':
      return [['target', formatQuantity(target.impedance_ohm, 'Ω')]];
    case 'step':
      return [
        ['ripple', q(target.ripple_percent, '%')],
        ['load step', q(target.step_A, 'A')],
        ['target', formatQuantity(targetFromStep(voltage_V, target.ripple_percent, target.step_A), 'Ω')],
      ];
    case 'mask':
      return [['target', target.points.map(([f, z]) => `${q(z, 'Ω')} at ${q(f, 'Hz')}`).join(', then ')]];
  }
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
  return `${q(plane.capacitance_F, 'F')}${size}`;
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

/** A rail's specification in words and figures, as rows of label and value. */
export function specFacts(spec: RailSpec): [string, string][] {
  return [
    ['rail', formatVolts(spec.voltage_V)],
    ...targetRows(spec),
    ['band', `${q(spec.band_Hz[0], 'Hz')} – ${q(spec.band_Hz[1], 'Hz')}`],
    ['source', sourceText(spec.source)],
    ['plane', planeText(spec)],
    ...packageRows(spec),
    ['seen at', spec.observe],
    ...stepRows(spec),
  ];
}
