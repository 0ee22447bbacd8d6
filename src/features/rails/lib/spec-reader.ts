import { type Parsed, parseLength, parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';
import { parseAge } from './age-text';
import { parseCelsius } from './celsius-text';
import { readPointsOnce } from './points-memo';
import type { SpecErrors, SpecField, SpecForm } from './spec-form';

/** Reads fields and notes at each what was not understood; its value is then NaN. */
export interface SpecReader {
  readonly form: SpecForm;
  readonly errors: SpecErrors;
  /** Lines on which the points of a field stand, by its point's index. */
  readonly lines: Partial<Record<SpecField, readonly number[]>>;
  quantity(field: SpecField, unit: UnitSymbol): number;
  /** Empty means zero where zero is a sensible default. */
  quantityOrZero(field: SpecField, unit: UnitSymbol): number;
  length(field: SpecField): number;
  celsius(field: SpecField): number;
  age(field: SpecField): number;
  points(field: SpecField, units: readonly UnitSymbol[]): number[][];
  /** The first fault of a field stays. */
  fault(field: SpecField, reason: string): void;
}

export function specReader(form: SpecForm): SpecReader {
  const errors: SpecErrors = {};
  const lines: Partial<Record<SpecField, readonly number[]>> = {};
  const text = (field: SpecField) => String(form[field]);
  const fault = (field: SpecField, reason: string) => {
    errors[field] ??= reason;
  };
  const take = (field: SpecField, parsed: Parsed): number => {
    if (parsed.ok) return parsed.value;
    fault(field, parsed.reason);
    return Number.NaN;
  };
  const quantity = (field: SpecField, unit: UnitSymbol) => take(field, parseQuantity(text(field), unit));
  return {
    form,
    errors,
    lines,
    fault,
    quantity,
    quantityOrZero: (field, unit) => (text(field).trim() === '' ? 0 : quantity(field, unit)),
    length: (field) => take(field, parseLength(text(field))),
    celsius: (field) => take(field, parseCelsius(text(field))),
    age: (field) => take(field, parseAge(text(field))),
    points: (field, units) => {
      const read = readPointsOnce(text(field), units);
      if (!read.ok) {
        fault(field, read.reason);
        return [];
      }
      lines[field] = read.lines;
      return read.rows;
    },
  };
}
