import { EngineError } from './errors';
import type { ImpedanceTable } from './network';

/**
 * A measured or simulated Z(f), made ready for look-up. Between two points ln|Z| and the unwrapped phase run
 * linearly over ln f: exact for a resistor, an inductor or a capacitor alone, and Z = Z_i·exp(m·(u − u_i)) has
 * the derivative m·Z. Outside its range the table goes on from its last point as its fitted series R–L–C does.
 */
export interface PreparedTable {
  u: Float64Array;
  logMagnitude: Float64Array;
  phase: Float64Array;
  fit: { resistance_ohm: number; inductance_H: number; elastance_perF: number };
}

/** Prepares a table; throws EngineError with `field` when it is empty, unsorted, not finite or holds a zero. */
export function prepareTable(table: ImpedanceTable, field: string): PreparedTable {
  const n = table.frequency_Hz.length;
  if (n < 2) throw new EngineError(field, 'an impedance table needs at least two points');
  const u = new Float64Array(n);
  const logMagnitude = new Float64Array(n);
  const phase = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const f = table.frequency_Hz[i];
    const re = table.re_ohm[i];
    const im = table.im_ohm[i];
    const at = `${field}[${i}]`;
    if (!(f > 0) || !Number.isFinite(f)) throw new EngineError(at, 'frequency must be above 0 Hz and finite');
    if (i > 0 && f <= table.frequency_Hz[i - 1]) throw new EngineError(at, 'frequencies must rise');
    if (!Number.isFinite(re) || !Number.isFinite(im))
      throw new EngineError(at, 'impedance must be a finite number');
    if (re < 0) throw new EngineError(at, 'resistance is negative: a passive impedance has Re Z ≥ 0');
    const magnitude = Math.hypot(re, im);
    if (magnitude === 0) throw new EngineError(at, 'impedance is zero');
    u[i] = Math.log(f);
    logMagnitude[i] = Math.log(magnitude);
    const angle = Math.atan2(im, re);
    // Re Z ≥ 0 keeps every angle within ±90°, so neighbours never wrap.
    phase[i] = angle;
  }
  return { u, logMagnitude, phase, fit: fitSeries(table) };
}

/** True when `frequency_Hz` lies outside the table, where the fitted series R–L–C stands in. */
export function isExtrapolated(table: PreparedTable, frequency_Hz: number): boolean {
  const u = Math.log(frequency_Hz);
  const slack = 1e-12;
  return u < table.u[0] - slack || u > table.u[table.u.length - 1] + slack;
}

/** Z in `out[0..1]` and dZ/d(ln f) in `out[2..3]`, ohms. */
export function tableImpedance(table: PreparedTable, frequency_Hz: number, out: Float64Array): void {
  const u = Math.log(frequency_Hz);
  const n = table.u.length;
  if (isExtrapolated(table, frequency_Hz)) {
    const omega = 2 * Math.PI * frequency_Hz;
    const { inductance_H, elastance_perF } = table.fit;
    const end = u < table.u[0] ? 0 : n - 1;
    const magnitude = Math.exp(table.logMagnitude[end]);
    const endOmega = 2 * Math.PI * Math.exp(table.u[end]);
    // From the table's last point on as the fit goes: the curve has a bend there, but no step.
    out[0] = magnitude * Math.cos(table.phase[end]);
    out[1] =
      magnitude * Math.sin(table.phase[end]) +
      (omega - endOmega) * inductance_H -
      elastance_perF * (1 / omega - 1 / endOmega);
    out[2] = 0;
    out[3] = omega * inductance_H + elastance_perF / omega;
    return;
  }
  let lo = 0;
  let hi = n - 1;
  while (hi - lo > 1) {
    const mid = (lo + hi) >> 1;
    if (table.u[mid] <= u) lo = mid;
    else hi = mid;
  }
  const span = table.u[hi] - table.u[lo];
  const t = (u - table.u[lo]) / span;
  const slopeMagnitude = (table.logMagnitude[hi] - table.logMagnitude[lo]) / span;
  const slopePhase = (table.phase[hi] - table.phase[lo]) / span;
  const magnitude = Math.exp(table.logMagnitude[lo] + t * span * slopeMagnitude);
  const angle = table.phase[lo] + t * span * slopePhase;
  const re = magnitude * Math.cos(angle);
  const im = magnitude * Math.sin(angle);
  out[0] = re;
  out[1] = im;
  out[2] = slopeMagnitude * re - slopePhase * im;
  out[3] = slopeMagnitude * im + slopePhase * re;
}

/**
 * Least squares for R + j(ωL − D/ω), D = 1/C, each point weighted by 1/|Z|² so that a decade of small impedance
 * counts as much as one of large. L and D are not allowed below zero.
 */
export function fitSeries(table: ImpedanceTable): PreparedTable['fit'] {
  let sw = 0;
  let swr = 0;
  let a11 = 0;
  let a12 = 0;
  let a22 = 0;
  let b1 = 0;
  let b2 = 0;
  for (let i = 0; i < table.frequency_Hz.length; i++) {
    const omega = 2 * Math.PI * table.frequency_Hz[i];
    const re = table.re_ohm[i];
    const im = table.im_ohm[i];
    const w = 1 / (re * re + im * im);
    sw += w;
    swr += w * re;
    a11 += w * omega * omega;
    a12 -= w;
    a22 += w / (omega * omega);
    b1 += w * omega * im;
    b2 -= (w * im) / omega;
  }
  const det = a11 * a22 - a12 * a12;
  let inductance_H = det > 0 ? (b1 * a22 - b2 * a12) / det : 0;
  let elastance_perF = det > 0 ? (a11 * b2 - a12 * b1) / det : 0;
  if (inductance_H < 0) {
    inductance_H = 0;
    elastance_perF = Math.max(0, b2 / a22);
  } else if (elastance_perF < 0) {
    elastance_perF = 0;
    inductance_H = Math.max(0, b1 / a11);
  }
  return { resistance_ohm: Math.max(0, swr / sw), inductance_H, elastance_perF };
}
