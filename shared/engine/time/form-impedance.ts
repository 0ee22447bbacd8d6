import { type CompiledRail, railImpedance, scratch } from '../rail';
import type { PoleForm } from './pole-form';

/** Z(jω) of a pole form at `frequency_Hz`, in ohm: re and im in `out[0..1]`. */
export function formImpedance(form: PoleForm, frequency_Hz: number, out: Float64Array): void {
  const omega = 2 * Math.PI * frequency_Hz;
  let re = form.resistance_ohm;
  let im = omega * form.inductance_H;
  for (let i = 0; i < form.poleRe.length; i++) {
    const a = form.poleRe[i];
    const b = form.poleIm[i];
    const rRe = form.residueRe[i];
    const rIm = form.residueIm[i];
    // r/(jω − p), and for a complex pole r̄/(jω − p̄) as well.
    for (const side of b === 0 ? [0] : [1, -1]) {
      const dIm = omega - side * b;
      const d2 = a * a + dIm * dIm;
      re += (-rRe * a + side * rIm * dIm) / d2;
      im += (-side * rIm * a - rRe * dIm) / d2;
    }
  }
  out[0] = re;
  out[1] = im;
}

/** Off the middle between two poles, where a branch without resistance may just have its resonance and no admittance. */
const OFF = 1.0371;

/** Largest difference between form and engine, relative to |Z|, beside and between all poles. */
export function disagreement(form: PoleForm, rail: CompiledRail): number {
  const sizes = Array.from(form.poleRe, (re, i) => Math.hypot(re, form.poleIm[i]) / (2 * Math.PI));
  const between = sizes.slice(1).map((f, i) => OFF * Math.sqrt(f * sizes[i]));
  const list = [...sizes, ...between, (sizes[0] ?? 1e6) / 10, (sizes[sizes.length - 1] ?? 1e6) * 10];
  const here = scratch();
  const out = new Float64Array(2);
  return list.reduce((worst, f) => {
    railImpedance(rail, f, here);
    formImpedance(form, f, out);
    const error = Math.hypot(out[0] - here[0], out[1] - here[1]) / Math.hypot(here[0], here[1]);
    return Number.isNaN(error) ? Number.POSITIVE_INFINITY : Math.max(worst, error);
  }, 0);
}
