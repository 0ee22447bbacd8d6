import type { RateModes } from './rate-modes';

/**
 * The step in which straight lines between samples stay within `chord_V` of the curve and no mode above `visible_V` goes through
 * more than `phase` rad; Infinity when no mode is above it. A chord of a swing of height x misses it by x·(|p|h)²/8.
 */
export function drawingStep(rates: RateModes, visible_V: number, chord_V: number, phase: number): number {
  const { size } = rates.modes;
  return rates.living.reduce((least, i) => {
    const height = Math.hypot(rates.vRe[i], rates.vIm[i]) / size[i];
    if (height <= visible_V) return least;
    return Math.min(least, Math.min(phase, Math.sqrt((8 * chord_V) / height)) / size[i]);
  }, Number.POSITIVE_INFINITY);
}

/** Time after which no mode is above `height_V`. */
export function settlesAfter(rates: RateModes, height_V: number): number {
  const { form, size } = rates.modes;
  return rates.living.reduce((most, i) => {
    const height = Math.hypot(rates.vRe[i], rates.vIm[i]) / size[i];
    return Math.max(most, Math.log(height / height_V) / -form.poleRe[i]);
  }, 0);
}

/**
 * Bound in volts on all that the modes can still move the voltage, up and down together, each taken alone: no more than |v|/α, and
 * since the rate of v·e^{pt}, p = −α + jω, passes zero every π/ω and each swing is q = e^{−απ/ω} of the one before, no more than
 * |v/p|·(2 + (1 + q)/(1 − q)): less than one swing up to the first turn, then all the others.
 */
export function restOf(rates: RateModes): number {
  const { form, size } = rates.modes;
  return rates.living.reduce((sum, i) => {
    const v = Math.hypot(rates.vRe[i], rates.vIm[i]);
    const decay = -form.poleRe[i];
    if (form.poleIm[i] === 0) return sum + v / decay;
    const q = Math.exp((-decay * Math.PI) / form.poleIm[i]);
    return sum + Math.min(v / decay, (v / size[i]) * (2 + (1 + q) / (1 - q)));
  }, 0);
}
