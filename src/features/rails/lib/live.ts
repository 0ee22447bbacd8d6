import {
  bandSchema,
  noiseBudgetSchema,
  type Source,
  sourceSchema,
  type Target,
  targetSchema,
} from '@shared/schemas/rail-spec.schema';
import { type BudgetFigures, budgetFigures } from './budget';
import { readBudget } from './read-budget';
import { readSource } from './read-source';
import { readBand, readTarget } from './read-target';
import type { SpecForm } from './spec-form';
import { specReader } from './spec-reader';

/*
 * Each subject of the form by itself, whatever the others hold, for what is said while one types; null: it cannot be read yet.
 */

export function liveVoltage_V(form: SpecForm): number | null {
  const voltage_V = specReader(form).quantity('voltage', 'V');
  return voltage_V > 0 ? voltage_V : null;
}

export function liveTarget(form: SpecForm): { target: Target; voltage_V: number } | null {
  const reader = specReader(form);
  const voltage_V = reader.quantity('voltage', 'V');
  const { target } = readTarget(reader, voltage_V);
  const read = targetSchema.safeParse(target);
  return read.success && voltage_V > 0 ? { target: read.data, voltage_V } : null;
}

export function liveBand(form: SpecForm): [number, number] | null {
  const read = bandSchema.safeParse(readBand(specReader(form)).band_Hz);
  return read.success ? read.data : null;
}

export function liveSource(form: SpecForm): Source | null {
  const reader = specReader(form);
  const read = sourceSchema.safeParse(readSource(reader));
  return read.success && Object.keys(reader.errors).length === 0 ? read.data : null;
}

export function liveBudget(form: SpecForm): BudgetFigures | null {
  const voltage_V = liveVoltage_V(form);
  const read = noiseBudgetSchema.safeParse(readBudget(specReader(form)));
  return read.success && voltage_V !== null ? budgetFigures(read.data, voltage_V) : null;
}
