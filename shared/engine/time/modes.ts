import { growth, growthScratch } from './growth';
import type { PoleForm } from './pole-form';

/**
 * The response of a pole form to a load current i(t), one complex number a mode. With c = r/p (doubled where a pole stands for a
 * pair) the voltage falls by L·i′ + Z(0)·i + Σ Re d, where d′ = p·d + c·i′: what each mode still owes to the settled state. Over
 * a stretch h in which i′ is constant, d(t + h) = e^{ph}·d(t) + i′·c·(e^{ph} − 1)/p exactly, however long h is.
 */
export class Modes {
  readonly count: number;
  readonly form: PoleForm;
  /** c = r/p and c/p, re and im. */
  readonly cRe: Float64Array;
  readonly cIm: Float64Array;
  readonly cpRe: Float64Array;
  readonly cpIm: Float64Array;
  /** |p| in rad/s. */
  readonly size: Float64Array;
  /** The state: d, in volts. Begins settled. */
  readonly dRe: Float64Array;
  readonly dIm: Float64Array;
  private readonly g = growthScratch();

  constructor(form: PoleForm) {
    const { poleRe, poleIm, residueRe, residueIm } = form;
    const n = poleRe.length;
    this.count = n;
    this.form = form;
    this.cRe = new Float64Array(n);
    this.cIm = new Float64Array(n);
    this.cpRe = new Float64Array(n);
    this.cpIm = new Float64Array(n);
    this.size = new Float64Array(n);
    this.dRe = new Float64Array(n);
    this.dIm = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      const times = poleIm[i] > 0 ? 2 : 1;
      const a = poleRe[i];
      const b = poleIm[i];
      const p2 = a * a + b * b;
      const re = (times * (residueRe[i] * a + residueIm[i] * b)) / p2;
      const im = (times * (residueIm[i] * a - residueRe[i] * b)) / p2;
      this.cRe[i] = re;
      this.cIm[i] = im;
      this.cpRe[i] = (re * a + im * b) / p2;
      this.cpIm[i] = (im * a - re * b) / p2;
      this.size[i] = Math.sqrt(p2);
    }
  }

  /** The load current jumps by `step_A`. */
  jump(step_A: number): void {
    for (let i = 0; i < this.count; i++) {
      this.dRe[i] += step_A * this.cRe[i];
      this.dIm[i] += step_A * this.cIm[i];
    }
  }

  /** `h_s` go by, in which the load current changes by `slope` ampere a second. */
  advance(h_s: number, slope: number): void {
    const { poleRe, poleIm } = this.form;
    const { cpRe, cpIm, dRe, dIm, g } = this;
    for (let i = 0; i < this.count; i++) {
      growth(poleRe[i], poleIm[i], h_s, g);
      const re = dRe[i];
      const im = dIm[i];
      dRe[i] = g[0] * re - g[1] * im + slope * (cpRe[i] * g[2] - cpIm[i] * g[1]);
      dIm[i] = g[0] * im + g[1] * re + slope * (cpRe[i] * g[1] + cpIm[i] * g[2]);
    }
  }

  /** How far the voltage is below its value without load, in volts, at a load of `current_A` that changes by `slope` A/s. */
  fall(current_A: number, slope: number): number {
    let sum = this.form.inductance_H * slope + this.form.dc_ohm * current_A;
    for (let i = 0; i < this.count; i++) sum += this.dRe[i];
    return sum;
  }
}
