import { growth, growthScratch } from './growth';
import type { RateModes } from './rate-modes';

const g = growthScratch();

/** Rate and its derivative at 0, h, … many·h. */
export function sampleRates(
  rates: RateModes,
  step_s: number,
  many: number,
  rate: Float64Array,
  bend: Float64Array,
): void {
  const { poleRe, poleIm } = rates.modes.form;
  rate.fill(rates.base, 0, many + 1);
  bend.fill(0, 0, many + 1);
  for (const i of rates.living) {
    growth(poleRe[i], poleIm[i], step_s, g);
    const [eRe, eIm] = g;
    let re = rates.vRe[i];
    let im = rates.vIm[i];
    for (let k = 0; k <= many; k++) {
      rate[k] += re;
      bend[k] += poleRe[i] * re - poleIm[i] * im;
      const next = eRe * re - eIm * im;
      im = eRe * im + eIm * re;
      re = next;
    }
  }
}

/** The fall at 0, h, … many·h in volts. */
export function sampleFall(rates: RateModes, step_s: number, many: number, fall: Float64Array): void {
  const { form, size } = rates.modes;
  for (let k = 0; k <= many; k++) fall[k] = rates.fall_V + rates.base * k * step_s;
  for (const i of rates.living) {
    const a = form.poleRe[i];
    const b = form.poleIm[i];
    growth(a, b, step_s, g);
    const [eRe, eIm, lessRe] = g;
    const p2 = size[i] * size[i];
    const xRe = (rates.vRe[i] * a + rates.vIm[i] * b) / p2;
    const xIm = (rates.vIm[i] * a - rates.vRe[i] * b) / p2;
    // (v/p)·(e^{pt} − 1) grows from 0 by itself: x ← e^{ph}·x + (v/p)·(e^{ph} − 1).
    const addRe = xRe * lessRe - xIm * eIm;
    const addIm = xRe * eIm + xIm * lessRe;
    let re = 0;
    let im = 0;
    for (let k = 1; k <= many; k++) {
      const next = eRe * re - eIm * im + addRe;
      im = eRe * im + eIm * re + addIm;
      re = next;
      fall[k] += re;
    }
  }
}
