import { EngineError } from '../errors';

/** Gives the value back; throws EngineError naming `field` when it is zero, negative, NaN or infinite. */
export function positive(field: string, value: number): number {
  if (!(value > 0) || !Number.isFinite(value)) throw new EngineError(field, 'must be above zero and finite');
  return value;
}

/** Gives the value back; throws EngineError naming `field` when it is negative, NaN or infinite. */
export function notNegative(field: string, value: number): number {
  if (!(value >= 0) || !Number.isFinite(value))
    throw new EngineError(field, 'must not be negative, and finite');
  return value;
}

/** Gives the value back; throws EngineError naming `field` unless it is a whole number of at least 1. */
export function wholeCount(field: string, value: number): number {
  if (!Number.isInteger(value) || value < 1)
    throw new EngineError(field, 'must be a whole number, at least 1');
  return value;
}
