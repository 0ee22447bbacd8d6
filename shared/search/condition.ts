import { branchAdmittance } from '../engine/branch';
import type { CompiledRail } from '../engine/rail';

/**
 * The target at one frequency as a condition on the node's admittance Y = x + jy (everything in parallel at the pins).
 *
 * **Derivation.** Looked at through a series impedance Zs onto a die Yd, the impedance is
 *   Z = 1/(Yd + 1/(Zs + 1/Y)) = (1 + Zs·Y) / (Yd + a·Y),  a = 1 + Yd·Zs,
 * so |Z| ≤ Zt says Zt²·|Yd + a·Y|² − |1 + Zs·Y|² ≥ 0. Multiplied out this is
 *   q(Y) = A·|Y|² + 2(px·x + py·y) + D ≥ 0,
 *   A = Zt²|a|² − |Zs|²,  px + j·py = conj(Zt²·conj(Yd)·a − Zs),  D = Zt²|Yd|² − 1.
 * At the pins Zs = Yd = 0: A = Zt², p = 0, D = −1, i.e. |Y| ≥ 1/Zt.
 *
 * **Shape.** The map's determinant is 1·a − Zs·Yd = 1, from which |p|² − A·D = Zt². Hence for A ≠ 0 the border q = 0 is
 * the circle with centre −p/A and radius Zt/|A|, whatever Yd and Zs are:
 *   A > 0: Y must lie outside the disk (or on it); A = 0: in a half-plane; A < 0: inside the disk.
 * A < 0 means that the series impedance alone is above the target (|Zs| > Zt·|a|): only a bank that cancels part of it
 * can help, and more of anything cannot.
 *
 * **Convex measure.** φ(Y) = (|A·Y + p| − Zt)/A has the sign of q for A > 0 and is convex in Y. Written as
 *   φ(Y) = q(Y) / (|A·Y + p| + Zt)
 * it divides by no small A, and at A = 0 is the half-plane's linear function: one formula serves all A ≥ 0.
 */
export interface Condition {
  a: number;
  px: number;
  py: number;
  d: number;
  zt: number;
}

/** What the load looks through: Zs and Yd at one frequency. */
export interface View {
  zsRe: number;
  zsIm: number;
  ydRe: number;
  ydIm: number;
}

/** The condition for a target of `zt` ohm seen through `view`. */
export function conditionAt(view: View, zt: number): Condition {
  const { zsRe, zsIm, ydRe, ydIm } = view;
  const aRe = 1 + ydRe * zsRe - ydIm * zsIm;
  const aIm = ydRe * zsIm + ydIm * zsRe;
  const t2 = zt * zt;
  // m = Zt²·conj(Yd)·a − Zs, p = conj(m)
  const mRe = t2 * (ydRe * aRe + ydIm * aIm) - zsRe;
  const mIm = t2 * (ydRe * aIm - ydIm * aRe) - zsIm;
  return {
    a: t2 * (aRe * aRe + aIm * aIm) - (zsRe * zsRe + zsIm * zsIm),
    px: mRe,
    py: -mIm,
    d: t2 * (ydRe * ydRe + ydIm * ydIm) - 1,
    zt,
  };
}

const scratch = new Float64Array(4);

/** Zs and Yd of a compiled rail at one frequency; all zero when it is looked at from the pins. */
export function viewAt(rail: CompiledRail, frequency_Hz: number): View {
  const view = rail.view;
  if (!view) return { zsRe: 0, zsIm: 0, ydRe: 0, ydIm: 0 };
  const zsIm = 2 * Math.PI * frequency_Hz * view.l;
  if (!view.die) return { zsRe: view.r, zsIm, ydRe: 0, ydIm: 0 };
  branchAdmittance(view.die, frequency_Hz, scratch, 'package');
  return { zsRe: view.r, zsIm, ydRe: scratch[0], ydIm: scratch[1] };
}

/** q(Y): not negative where the target is met. */
export function quadratic(c: Condition, x: number, y: number): number {
  return c.a * (x * x + y * y) + 2 * (c.px * x + c.py * y) + c.d;
}
