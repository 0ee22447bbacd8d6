import type { RailSpec, Source } from '@shared/schemas/rail-spec.schema';
import { formatInput } from '@shared/units/format';
import { millimetres } from './millimetres';
import { pointsInput } from './points-input';
import type { SpecForm } from './spec-form';

type Fields = Partial<SpecForm>;

export function sourceFields(source: Source): Fields {
  switch (source.kind) {
    case 'open':
      return { sourceKind: 'open' };
    case 'table':
      return { sourceKind: 'table', sourceTable: pointsInput(source.points) };
    case 'rl':
      return {
        sourceKind: 'rl',
        resistance: formatInput(source.resistance_ohm),
        inductance: formatInput(source.inductance_H),
      };
    case 'damped':
      return {
        sourceKind: 'damped',
        seriesResistance: formatInput(source.series_resistance_ohm),
        seriesInductance: formatInput(source.series_inductance_H),
        inductorResistance: formatInput(source.inductor_resistance_ohm),
        inductorInductance: formatInput(source.inductance_H),
        dampingResistance: formatInput(source.damping_ohm),
        dampingInductance: formatInput(source.damping_inductance_H),
      };
  }
}

export function planeFields({ plane }: RailSpec): Fields {
  if (!plane) return { planeKind: 'none' };
  const { geometry } = plane;
  return {
    planeKind: geometry ? (geometry.pair ? 'stackup' : 'dimensions') : 'values',
    planeCapacitance: formatInput(plane.capacitance_F),
    planeResistance: formatInput(plane.resistance_ohm),
    planeInductance: formatInput(plane.inductance_H),
    ...(geometry && {
      length: millimetres(geometry.length_m),
      width: millimetres(geometry.width_m),
      spacing: millimetres(geometry.spacing_m),
      permittivity: String(geometry.relative_permittivity),
      viaRadius: millimetres(geometry.via_radius_m),
      loadRadius: millimetres(geometry.load_radius_m),
    }),
    ...(geometry?.pair && { pairUpper: geometry.pair[0], pairLower: geometry.pair[1] }),
  };
}
