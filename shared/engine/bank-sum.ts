import { type Branch, branchAdmittance } from './branch';

/** Admittance over a grid, siemens: conductance `g` and susceptance `b` per frequency. */
export interface AdmittanceArray {
  g: Float64Array;
  b: Float64Array;
}

/**
 * Adds `count` times the admittance of one branch over a grid to `total`. `omega` is 2πf. For a series branch: one division an
 * element, Y = (R − jX)/(R² + X²) with X = ωL − D/ω; 1/ω comes from the caller, so that it is divided once per grid.
 */
export function addAdmittance(
  branch: Branch,
  count: number,
  omega: Float64Array,
  inverseOmega: Float64Array,
  total: AdmittanceArray,
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

/** Admittance of one branch over a grid, as `addAdmittance` to nothing. */
export function admittanceOver(
  branch: Branch,
  omega: Float64Array,
  inverseOmega: Float64Array,
): AdmittanceArray {
  const out = { g: new Float64Array(omega.length), b: new Float64Array(omega.length) };
  addAdmittance(branch, 1, omega, inverseOmega, out);
  return out;
}

/**
 * Total admittance of a bank over a grid that answers a changed count with one multiply-add an element instead of
 * a new sum. After 4096 changes the total is summed anew, so that rounding never piles up beyond 1e-12.
 */
export class BankSum {
  readonly total: AdmittanceArray;
  private readonly units: AdmittanceArray[];
  private readonly counts: number[];
  private changes = 0;

  constructor(units: AdmittanceArray[], counts: readonly number[], size: number) {
    this.units = units;
    this.counts = [...counts];
    this.total = { g: new Float64Array(size), b: new Float64Array(size) };
    this.resum();
  }

  /** Sets the count of member `index`; costs one pass over the grid. */
  setCount(index: number, count: number): void {
    const delta = count - this.counts[index];
    if (delta === 0) return;
    this.counts[index] = count;
    if (++this.changes % 4096 === 0) {
      this.resum();
      return;
    }
    const { g, b } = this.total;
    const unit = this.units[index];
    for (let i = 0; i < g.length; i++) {
      g[i] += delta * unit.g[i];
      b[i] += delta * unit.b[i];
    }
  }

  /** Sums all members from scratch. */
  resum(): void {
    const { g, b } = this.total;
    g.fill(0);
    b.fill(0);
    this.units.forEach((unit, k) => {
      const count = this.counts[k];
      if (count === 0) return;
      for (let i = 0; i < g.length; i++) {
        g[i] += count * unit.g[i];
        b[i] += count * unit.b[i];
      }
    });
  }
}
