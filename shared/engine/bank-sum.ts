import { type Branch, branchAdmittance } from './branch';

/** Admittance over a grid, siemens: conductance `g`, susceptance `b`, and their derivatives by ln f. */
export interface SampledAdmittance {
  g: Float64Array;
  b: Float64Array;
  dg: Float64Array;
  db: Float64Array;
}

/** Admittance of one branch over a grid. */
export function sampleAdmittance(
  branch: Branch,
  frequency_Hz: Float64Array,
  field?: string,
): SampledAdmittance {
  const out = blankSamples(frequency_Hz.length);
  addSamples(branch, 1, frequency_Hz, out, field);
  return out;
}

/** Adds `count` times a branch's admittance over a grid to `total`. */
export function addSamples(
  branch: Branch,
  count: number,
  frequency_Hz: Float64Array,
  total: SampledAdmittance,
  field?: string,
): void {
  if (branch.kind === 'series' && branch.r > 0) {
    addSeries(branch, count, frequency_Hz, total);
    return;
  }
  const y = new Float64Array(4);
  for (let i = 0; i < frequency_Hz.length; i++) {
    branchAdmittance(branch, frequency_Hz[i], y, field);
    total.g[i] += count * y[0];
    total.b[i] += count * y[1];
    total.dg[i] += count * y[2];
    total.db[i] += count * y[3];
  }
}

/** The same law as `branchAdmittance` in one plain loop: most members of a bank are series branches. */
function addSeries(
  { r, l, d }: { r: number; l: number; d: number },
  count: number,
  frequency_Hz: Float64Array,
  { g, b, dg, db }: SampledAdmittance,
): void {
  const r2 = r * r;
  for (let i = 0; i < frequency_Hz.length; i++) {
    const omega = 2 * Math.PI * frequency_Hz[i];
    const xl = omega * l;
    const xc = d / omega;
    const x = xl - xc;
    const q = 1 / (r2 + x * x);
    const yr = r * q;
    const yi = -x * q;
    // dZ = j·(xl + xc), dY = −Y²·dZ
    const slope = xl + xc;
    g[i] += count * yr;
    b[i] += count * yi;
    dg[i] += count * 2 * yr * yi * slope;
    db[i] += count * (yi * yi - yr * yr) * slope;
  }
}

export const blankSamples = (n: number): SampledAdmittance => ({
  g: new Float64Array(n),
  b: new Float64Array(n),
  dg: new Float64Array(n),
  db: new Float64Array(n),
});

/** After so many changes the total is summed anew, so that rounding never piles up beyond about 1e-12. */
const RESUM_AFTER = 1024;

/**
 * Total admittance of a node over a grid that answers a changed count with one multiply-add an element instead of a new
 * sum of all members.
 */
export class BankSum {
  readonly frequency_Hz: Float64Array;
  readonly units: readonly SampledAdmittance[];
  readonly total: SampledAdmittance;
  private readonly counts: number[];
  private changes = 0;

  constructor(frequency_Hz: Float64Array, units: readonly SampledAdmittance[], counts: readonly number[]) {
    this.frequency_Hz = frequency_Hz;
    this.units = units;
    this.counts = [...counts];
    this.total = blankSamples(frequency_Hz.length);
    this.resum();
  }

  /** Sets all counts; only what differs is touched. */
  setCounts(counts: readonly number[]): void {
    counts.forEach((count, index) => {
      this.setCount(index, count);
    });
  }

  /** Sets the count of one member: one pass over the grid. */
  setCount(index: number, count: number): void {
    const delta = count - this.counts[index];
    if (delta === 0) return;
    this.counts[index] = count;
    if (++this.changes % RESUM_AFTER === 0) this.resum();
    else this.add(index, delta);
  }

  /** Sums all members from scratch. */
  resum(): void {
    for (const array of Object.values(this.total)) array.fill(0);
    this.counts.forEach((count, index) => {
      if (count !== 0) this.add(index, count);
    });
  }

  private add(index: number, times: number): void {
    const unit = this.units[index];
    const { g, b, dg, db } = this.total;
    for (let i = 0; i < g.length; i++) {
      g[i] += times * unit.g[i];
      b[i] += times * unit.b[i];
      dg[i] += times * unit.dg[i];
      db[i] += times * unit.db[i];
    }
  }
}
