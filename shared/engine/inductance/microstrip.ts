import { C0_M_PER_S, MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { positive } from './checks';

const INCH_M = 0.0254;
const WAVE_OHM = MU0_H_PER_M * C0_M_PER_S;

/**
 * Loop inductance of a thin trace over a wide plane, H/m: impedance of the line in air divided by c; the dielectric does not
 * matter to it. Width of the trace and height over the plane in metres.
 * With u = w/h: Z = (η₀/2π)·ln(f/u + √(1 + 4/u²)), f = 6 + (2π − 6)·exp(−(30.666/u)^0.7528).
 * Stated accuracy 0.01 % up to u = 1 and 0.03 % up to u = 1000; no thickness. Throws EngineError for sizes of zero or less.
 * Source: E. Hammerstad, O. Jensen, IEEE MTT-S Digest 1980, 407–409 (from memory, checked against another implementation).
 */
export function microstrip_HPerM(width_m: number, height_m: number): number {
  const u = positive('width_m', width_m) / positive('height_m', height_m);
  const f = 6 + (2 * Math.PI - 6) * Math.exp(-((30.666 / u) ** 0.7528));
  const impedance = (WAVE_OHM / (2 * Math.PI)) * Math.log(f / u + Math.sqrt(1 + 4 / (u * u)));
  return impedance / C0_M_PER_S;
}

/**
 * The same by the handbook form with the trace's thickness t, H/m: 5.071·ln(5.98h/(0.8w + t)) nH/in, metres. For narrow traces:
 * 4 % below Hammerstad and Jensen at w = h/2, 12 % at w = h with t = 0.14h. A check, not for use. Throws EngineError for sizes of zero or less and where the logarithm is not above zero.
 * Source: IPC-2141 surface microstrip, Z₀²·C₀ (from memory).
 */
export function microstripIpc_HPerM(width_m: number, height_m: number, thickness_m: number): number {
  const ratio =
    (5.98 * positive('height_m', height_m)) /
    (0.8 * positive('width_m', width_m) + positive('thickness_m', thickness_m));
  if (!(ratio > 1)) throw new EngineError('width_m', 'is too wide beside the height for this formula');
  return (5.071e-9 / INCH_M) * Math.log(ratio);
}

/**
 * The same as a mailing list remembered it, H/m: 5·ln(2πh/w) nH/in, metres: about 14 % below Hammerstad and Jensen at w = h. A check,
 * not for use. Throws EngineError for sizes of zero or less and from w = 2πh on. Source: SI-LIST, Nov. 1998.
 */
export function microstripQuick_HPerM(width_m: number, height_m: number): number {
  const ratio = (2 * Math.PI * positive('height_m', height_m)) / positive('width_m', width_m);
  if (!(ratio > 1)) throw new EngineError('width_m', 'is too wide beside the height for this formula');
  return (5e-9 / INCH_M) * Math.log(ratio);
}
