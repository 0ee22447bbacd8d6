import { type Branch, branchAdmittance } from './branch';
import { EngineError } from './errors';
import type { CompiledRail } from './rail';

interface ComplexArray {
  g: Float64Array;
  b: Float64Array;
}

/** Complex impedance over a list of frequencies, ohm. */
export interface ImpedanceArray {
  re_ohm: Float64Array;
  im_ohm: Float64Array;
}

/**
 * The impedance that the load sees at every frequency of a list, in one pass a member: about one division for each member and
 * frequency. Same law as `railImpedance`. Throws EngineError for a frequency that is not above zero and finite.
 */
export function impedanceOver(rail: CompiledRail, frequency_Hz: ArrayLike<number>): ImpedanceArray {
  const n = frequency_Hz.length;
  const omega = new Float64Array(n);
  const inverse = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const f = frequency_Hz[i];
    if (!(f > 0) || !Number.isFinite(f))
      throw new EngineError('frequency_Hz', 'frequency must be above 0 Hz and finite', f);
    omega[i] = 2 * Math.PI * f;
    inverse[i] = 1 / omega[i];
  }
  const y = zeros(n);
  for (const { branch, count } of rail.members)
    if (count > 0) addAdmittance(branch, count, omega, inverse, y);
  const { view } = rail;
  if (view) {
    invert(y, frequency_Hz);
    for (let i = 0; i < n; i++) {
      y.g[i] += view.r;
      y.b[i] += omega[i] * view.l;
    }
    if (!view.die) return { re_ohm: y.g, im_ohm: y.b };
    invert(y, frequency_Hz);
    addAdmittance(view.die, 1, omega, inverse, y);
  }
  invert(y, frequency_Hz);
  return { re_ohm: y.g, im_ohm: y.b };
}

const zeros = (n: number): ComplexArray => ({ g: new Float64Array(n), b: new Float64Array(n) });

/** 1/v in place, element by element. */
function invert({ g, b }: ComplexArray, frequency_Hz: ArrayLike<number>): void {
  for (let i = 0; i < g.length; i++) {
    const q = 1 / (g[i] * g[i] + b[i] * b[i]);
    if (!Number.isFinite(q))
      throw new EngineError('network', 'impedance is zero or without end here', frequency_Hz[i]);
    g[i] *= q;
    b[i] *= -q;
  }
}

/**
 * Adds `count` times the admittance of one branch to `total`. For a series branch: one division an element,
 * Y = (R − jX)/(R² + X²) with X = ωL − D/ω, 1/ω divided once for all members.
 */
export function addAdmittance(
  branch: Branch,
  count: number,
  omega: Float64Array,
  inverseOmega: Float64Array,
  total: ComplexArray,
): void {
  const { g, b } = total;
  const n = omega.length;
  if (branch.kind === 'series') {
    const { r, l, d } = branch;
    const r2 = r * r;
    const nr = count * r;
    for (let i = 0; i < n; i++) {
      const x = omega[i] * l - d * inverseOmega[i];
      const q = 1 / (r2 + x * x);
      g[i] += nr * q;
      b[i] -= count * x * q;
    }
    return;
  }
  const y = new Float64Array(4);
  for (let i = 0; i < n; i++) {
    branchAdmittance(branch, omega[i] / (2 * Math.PI), y);
    g[i] += count * y[0];
    b[i] += count * y[1];
  }
}
