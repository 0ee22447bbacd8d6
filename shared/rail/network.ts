import type { LineModel, PackageModel, RailNetwork, SourceModel } from '../engine/network';
import { pathInductance } from '../engine/plane';
import type { RailDocument } from '../schemas/rail-document.schema';
import type { RailSpec, Source } from '../schemas/rail-spec.schema';
import { impedanceTable, type PartInCorner } from './in-service';

function sourceModel(source: Source): SourceModel {
  if (source.kind !== 'table') return source;
  return { kind: 'table', table: impedanceTable(source.points) };
}

/** Inductance in henry of the path from a line at `distance_m` to the load; 0 while plane or distance is not known. */
export function linePath_H(spec: Pick<RailSpec, 'plane'>, distance_m: number | undefined): number {
  const geometry = spec.plane?.geometry;
  if (!geometry || distance_m === undefined) return 0;
  return pathInductance(geometry.spacing_m, distance_m, geometry.via_radius_m, geometry.load_radius_m);
}

/** One line of a bank as the engine takes it: ESL + mount + path in series; a measured table has its ESL in it already. */
export function lineModel(
  spec: Pick<RailSpec, 'plane'>,
  part: PartInCorner,
  line: { count: number; mount_H?: number; distance_m?: number },
): LineModel {
  const outside_H = (line.mount_H ?? part.mount_H) + linePath_H(spec, line.distance_m);
  const shift = part.table_shift;
  return {
    id: part.id,
    count: line.count,
    esr_ohm: part.esr_ohm,
    capacitance_F: part.capacitance_F,
    inductance_H: part.esl_H + outside_H,
    ...(part.esr_table && {
      esr_table: {
        frequency_Hz: Float64Array.from(part.esr_table, (p) => p[0]),
        resistance_ohm: Float64Array.from(part.esr_table, (p) => p[1]),
      },
    }),
    ...(part.impedance_table && {
      table: impedanceTable(part.impedance_table),
      added_inductance_H: outside_H + (shift?.inductance_H ?? 0),
      added_elastance_perF: shift?.elastance_perF ?? 0,
      resistance_factor: shift?.resistance_factor ?? 1,
    }),
  };
}

/** A rail with lines already made. */
export function networkWith(spec: RailSpec, lines: LineModel[]): RailNetwork {
  return {
    source: sourceModel(spec.source),
    ...(spec.plane && {
      plane: {
        capacitance_F: spec.plane.capacitance_F,
        resistance_ohm: spec.plane.resistance_ohm,
        inductance_H: spec.plane.inductance_H,
      },
    }),
    lines,
    ...(spec.package && { package: spec.package satisfies PackageModel }),
    observe: spec.observe,
  };
}

/** The rail of a document as the engine takes it. */
export function networkOf(document: RailDocument): RailNetwork {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const lines = document.bank.flatMap((line) => {
    const part = parts.get(line.part);
    return part ? [lineModel(document.rail, part, line)] : [];
  });
  return networkWith(document.rail, lines);
}
