import { EngineError } from './errors';
import type { EsrTable } from './network';

/** ESR over frequency made ready for look-up: ln f and ln R. */
export interface PreparedEsr {
  u: Float64Array;
  logR: Float64Array;
}

/** Prepares a table; throws EngineError naming `field` when it is empty, unsorted, not finite or not above zero. */
export function prepareEsr(table: EsrTable, field: string): PreparedEsr {
  const { frequency_Hz, resistance_ohm } = table;
  if (frequency_Hz.length < 2) throw new EngineError(field, 'an ESR table needs at least two points');
  for (let i = 0; i < frequency_Hz.length; i++) {
    const at = `${field}[${i}]`;
    if (!(frequency_Hz[i] > 0) || !Number.isFinite(frequency_Hz[i]))
      throw new EngineError(at, 'frequency must be above 0 Hz and finite');
    if (i > 0 && frequency_Hz[i] <= frequency_Hz[i - 1]) throw new EngineError(at, 'frequencies must rise');
    if (!(resistance_ohm[i] > 0) || !Number.isFinite(resistance_ohm[i]))
      throw new EngineError(at, 'ESR must be above zero and finite');
  }
  return { u: frequency_Hz.map(Math.log), logR: resistance_ohm.map(Math.log) };
}

/** R in `out[0]` (ohm) and dR/d(ln f) in `out[1]`: straight on log–log paper between the points, level beyond the ends. */
export function esrAt(table: PreparedEsr, frequency_Hz: number, out: Float64Array): void {
  const { u, logR } = table;
  const last = u.length - 1;
  const x = Math.log(frequency_Hz);
  if (x <= u[0] || x >= u[last]) {
    out[0] = Math.exp(x <= u[0] ? logR[0] : logR[last]);
    out[1] = 0;
    return;
  }
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (u[middle] <= x) low = middle;
    else high = middle;
  }
  const slope = (logR[high] - logR[low]) / (u[high] - u[low]);
  out[0] = Math.exp(logR[low] + slope * (x - u[low]));
  out[1] = slope * out[0];
}
