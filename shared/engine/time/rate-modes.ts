import { growth, growthScratch } from './growth';
import type { Stretch } from './load-current';
import type { Modes } from './modes';

/**
 * The rate of change of the voltage in a stretch, V/s: base + Σ Re v with v = p·d + c·i′ and base = Z(0)·i′. Followed instead of the state
 * itself, since e^{pt} alone moves it: v(t + h) = e^{ph}·v(t). Positive when the voltage falls. Times count from where it stands.
 */
export class RateModes {
  readonly vRe: Float64Array;
  readonly vIm: Float64Array;
  living: number[];
  readonly base: number;
  private readonly g = growthScratch();
  /** How far the voltage is below its value without load, followed by what moves it, so that nothing large cancels. */
  fall_V: number;

  constructor(
    readonly modes: Modes,
    { current_A, slope }: Stretch,
  ) {
    const { form, count, cRe, cIm, dRe, dIm } = modes;
    this.vRe = new Float64Array(count);
    this.vIm = new Float64Array(count);
    for (let i = 0; i < count; i++) {
      this.vRe[i] = form.poleRe[i] * dRe[i] - form.poleIm[i] * dIm[i] + slope * cRe[i];
      this.vIm[i] = form.poleRe[i] * dIm[i] + form.poleIm[i] * dRe[i] + slope * cIm[i];
    }
    this.living = Array.from({ length: count }, (_, i) => i);
    this.base = form.dc_ohm * slope;
    this.fall_V = modes.fall(current_A, slope);
  }

  /** Takes out modes that can move the voltage by no more than `least_V`; gives the largest |p| of those left, or 0. */
  bury(least_V: number): number {
    const { form, size } = this.modes;
    this.living = this.living.filter(
      (i) => Math.hypot(this.vRe[i], this.vIm[i]) > least_V * Math.abs(form.poleRe[i]),
    );
    return this.living.reduce((most, i) => Math.max(most, size[i]), 0);
  }

  /** Rate and its derivative at one time. */
  at(after_s: number): [rate: number, bend: number] {
    const { poleRe, poleIm } = this.modes.form;
    let rate = this.base;
    let bend = 0;
    for (const i of this.living) {
      growth(poleRe[i], poleIm[i], after_s, this.g);
      const re = this.g[0] * this.vRe[i] - this.g[1] * this.vIm[i];
      const im = this.g[0] * this.vIm[i] + this.g[1] * this.vRe[i];
      rate += re;
      bend += poleRe[i] * re - poleIm[i] * im;
    }
    return [rate, bend];
  }

  /** By how much the voltage falls until then: base·t + Σ Re(v·(e^{pt} − 1)/p). */
  fallsBy(after_s: number): number {
    const { form, size } = this.modes;
    let sum = this.base * after_s;
    for (const i of this.living) {
      growth(form.poleRe[i], form.poleIm[i], after_s, this.g);
      const re = this.vRe[i] * this.g[2] - this.vIm[i] * this.g[1];
      const im = this.vRe[i] * this.g[1] + this.vIm[i] * this.g[2];
      sum += (re * form.poleRe[i] + im * form.poleIm[i]) / (size[i] * size[i]);
    }
    return sum;
  }

  /** Goes on by `by_s`. */
  advance(by_s: number): void {
    this.fall_V += this.fallsBy(by_s);
    const { poleRe, poleIm } = this.modes.form;
    for (const i of this.living) {
      growth(poleRe[i], poleIm[i], by_s, this.g);
      const re = this.g[0] * this.vRe[i] - this.g[1] * this.vIm[i];
      this.vIm[i] = this.g[0] * this.vIm[i] + this.g[1] * this.vRe[i];
      this.vRe[i] = re;
    }
  }
}
