import { EngineError } from '../engine/errors';
import { inService, type ServiceValues } from '../engine/service/in-service';
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
      table_shift: {
        inductance_H: esl_H - part.esl_H,
        elastance_perF: 1 / capacitance_F - 1 / part.capacitance_F,
        resistance_factor: esr_factor,
      },
    }),
  };
}

/**
 * The same rail with its bank's and search's parts as they are at a corner of its conditions, so that everything that takes a
 * document (analysis, search, farthest distances) can be asked there. The document's own part numbers are its catalogue.
 */
export function documentIn(document: RailDocument, corner: Corner): RailDocument {
  return { ...document, parts: document.parts.map((part) => partIn(part, document.rail, corner)) };
}
