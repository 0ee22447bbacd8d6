import type { Source } from '@shared/schemas/rail-spec.schema';
import type { SpecReader } from './spec-reader';

export function readSource(reader: SpecReader): Source {
  switch (reader.form.sourceKind) {
    case 'open':
      return { kind: 'open' };
    case 'rl':
      return {
        kind: 'rl',
        resistance_ohm: reader.quantityOrZero('resistance', 'Ω'),
        inductance_H: reader.quantityOrZero('inductance', 'H'),
      };
    case 'table':
      return { kind: 'table', points: readTable(reader) };
    case 'damped':
      return {
        kind: 'damped',
        series_resistance_ohm: reader.quantityOrZero('seriesResistance', 'Ω'),
        series_inductance_H: reader.quantityOrZero('seriesInductance', 'H'),
        inductor_resistance_ohm: reader.quantityOrZero('inductorResistance', 'Ω'),
        inductance_H: reader.quantity('inductorInductance', 'H'),
        damping_ohm: reader.quantity('dampingResistance', 'Ω'),
        damping_inductance_H: reader.quantityOrZero('dampingInductance', 'H'),
      };
  }
}

function readTable(reader: SpecReader): [number, number, number][] {
  const rows = reader
    .points('sourceTable', ['Hz', 'Ω', 'Ω'])
    .map(([f, re, im]): [number, number, number] => [f, re, im]);
  const nothing = rows.findIndex(([, re, im]) => re === 0 && im === 0);
  // A source without any impedance would hold any target.
  if (nothing >= 0)
    reader.fault('sourceTable', `line ${reader.lines.sourceTable?.[nothing]}: the impedance is zero`);
  return rows;
}
