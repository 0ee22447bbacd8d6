import { type Part, type PartFields, partFieldsSchema } from '@shared/schemas/part.schema';
import type { PartEntity } from '../db/entities/part.entity';
import { personRef } from './person.service';

/** Every field a person enters; the entity holds them under the same names. */
export const partFieldNames = partFieldsSchema.keyof().options;

export function partView(part: PartEntity): Part {
  return {
    id: part.id,
    partNumber: part.partNumber,
    description: part.description,
    technology: part.technology,
    dielectric: part.dielectric,
    caseSize: part.caseSize,
    capacitance_F: part.capacitance_F,
    tolerance: part.tolerance,
    rated_voltage_V: part.rated_voltage_V,
    esr_ohm: part.esr_ohm,
    esl_H: part.esl_H,
    mount_H: part.mount_H,
    height_mm: part.height_mm,
    termination: part.termination,
    unit_cost: part.unit_cost,
    area_mm2: part.area_mm2,
    bias_curve: part.bias_curve,
    temperature_curve: part.temperature_curve,
    ageing_percent_per_decade: part.ageing_percent_per_decade,
    esr_table: part.esr_table,
    impedance_table: part.impedance_table,
    esr_tolerance_percent: part.esr_tolerance_percent,
    esl_tolerance_percent: part.esl_tolerance_percent,
    state: part.state,
    version: part.version,
    createdAt: part.createdAt,
    updatedAt: part.updatedAt,
    updatedBy: personRef(part.updatedBy),
  };
}

/** What is derived from the fields for unique numbers and for free text. */
export function partKeys(fields: PartFields): { numberKey: string; searchText: string } {
  const words = [
    fields.partNumber,
    fields.description,
    fields.dielectric,
    fields.caseSize,
    fields.technology,
  ];
  return {
    numberKey: fields.partNumber.normalize('NFC').toLowerCase(),
    searchText: words.join(' ').toLowerCase(),
  };
}
