import { type Band, steady } from './band';
import { BASIS } from './basis';
import type { Electrolytic } from './family';

const REFERENCE_C = 20;
/** Wet aluminium stiffens in the cold: % of the 20 °C value per kelvin below and above it. */
const ALUMINIUM_BELOW = 0.25;
const ALUMINIUM_ABOVE = 0.1;
/** ± % per kelvin either way from 20 °C; which way depends on the make, so this is a band and not a value. */
const SPREAD = { tantalum: 0.06, polymer: 0.05, film: 0.03 } as const;

/**
 * How capacitors that have neither a curve nor a code usually drift, temperature in °C. Common practice, moderate figures inside
 * what data sheets promise; always an estimate, except at 20 °C where there is nothing to estimate.
 */
export function usualDrift(kind: Electrolytic | 'film', temperature_C: number): Band {
  const rise_K = temperature_C - REFERENCE_C;
  if (rise_K === 0) return steady(1, false, BASIS.atReference);
  if (kind === 'aluminium') {
    const slope = rise_K < 0 ? ALUMINIUM_BELOW : ALUMINIUM_ABOVE;
    return steady(1 + (slope / 100) * rise_K, true, BASIS.usualDrift(kind));
  }
  const spread = (SPREAD[kind] / 100) * Math.abs(rise_K);
  return { factor: 1, low: 1 - spread, high: 1 + spread, estimated: true, basis: BASIS.usualDrift(kind) };
}
