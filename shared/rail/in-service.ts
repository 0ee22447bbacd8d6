import { EngineError } from '../engine/errors';
import type { ImpedanceTable } from '../engine/network';
import { inService, type ServiceValues } from '../engine/service/in-service';
import { fitSeries } from '../engine/table';
import type { DocumentPart, RailDocument } from '../schemas/rail-document.schema';
import type { RailSpec } from '../schemas/rail-spec.schema';
import { conditionsOf } from './conditions';
import { ageOf_h, type Corner, temperatureOf_C } from './corner';

/** What a changed part adds to its measured impedance table (which is its catalogue self): see LineModel.table. */
export interface TableShift {
  inductance_H: number;
  elastance_perF: number;
  resistance_factor: number;
}

/** A part whose numbers are those of a corner. */
export interface PartInCorner extends DocumentPart {
  table_shift?: TableShift;
}

/** A part's values and factors on this rail at a corner. Throws EngineError naming the part's field (bias above its rating …). */
export function serviceValues(
  part: DocumentPart,
  spec: Pick<RailSpec, 'voltage_V' | 'conditions'>,
  corner: Corner,
): ServiceValues {
  const { conditions } = conditionsOf(spec);
  try {
    return inService(part, {
      voltage_V: spec.voltage_V,
      temperature_C: temperatureOf_C(conditions, corner),
      age_h: ageOf_h(conditions, corner),
      capacitance: corner.capacitance,
      esr: corner.esr,
      esl: corner.esl,
    });
  } catch (error) {
    if (error instanceof EngineError)
      throw new EngineError(`parts[${part.id}].${error.field}`, `${part.id}: ${error.message}`);
    throw error;
  }
}

/** The part with the numbers that it has at a corner. */
export function partIn(
  part: DocumentPart,
  spec: Pick<RailSpec, 'voltage_V' | 'conditions'>,
  corner: Corner,
): PartInCorner {
  const values = serviceValues(part, spec, corner);
  const { capacitance_F, esr_ohm, esl_H, esr_factor } = values;
  return {
    ...part,
    capacitance_F,
    esr_ohm,
    esl_H,
    ...(part.esr_table &&
      esr_factor !== 1 && {
        esr_table: part.esr_table.map(([f, r]): [number, number] => [f, r * esr_factor]),
      }),
    ...(part.impedance_table && {
      table_shift: tableShift(part.impedance_table, values.capacitance_factor, esr_factor, values.esl_factor),
    }),
  };
}

/** What factors of C, ESR and ESL change of a measured table: by the table's own C and L, not by the catalogue's. */
export function tableShift(
  points: NonNullable<DocumentPart['impedance_table']>,
  capacitance_factor: number,
  esr_factor: number,
  esl_factor: number,
): TableShift {
  const { inductance_H, elastance_perF } = fitSeries(impedanceTable(points));
  return {
    inductance_H: inductance_H * (esl_factor - 1),
    elastance_perF: elastance_perF * (1 / capacitance_factor - 1),
    resistance_factor: esr_factor,
  };
}

/** Rows of [Hz, Re, Im] as the engine takes them. */
export const impedanceTable = (points: readonly (readonly [number, number, number])[]): ImpedanceTable => ({
  frequency_Hz: Float64Array.from(points, (p) => p[0]),
  re_ohm: Float64Array.from(points, (p) => p[1]),
  im_ohm: Float64Array.from(points, (p) => p[2]),
});

/**
 * The same rail with its bank's and search's parts as they are at a corner of its conditions, so that everything that takes a
 * document (analysis, search, farthest distances) can be asked there. The document's own part numbers are its catalogue.
 */
export function documentIn(document: RailDocument, corner: Corner): RailDocument {
  const parts = document.parts.map((part, i) => {
    try {
      return partIn(part, document.rail, corner);
    } catch (error) {
      if (!(error instanceof EngineError)) throw error;
      // Where a part is one of a list its place says more to a reader of the file than its name alone.
      throw new EngineError(error.field.replace(`parts[${part.id}]`, `parts[${i}]`), error.message);
    }
  });
  return { ...document, parts };
}
