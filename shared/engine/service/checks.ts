import { EngineError } from '../errors';

/** Gives the value back; throws EngineError naming `field` when it is NaN or infinite. */
export function finite(field: string, value: number): number {
  if (!Number.isFinite(value)) throw new EngineError(field, 'must be a finite number');
  return value;
}

/** Gives the value back; throws EngineError naming `field` when it is negative, NaN or infinite. */
export function notNegative(field: string, value: number): number {
  if (finite(field, value) < 0) throw new EngineError(field, 'must not be negative');
  return value;
}
