import { addSamples, BankSum, blankSamples, sampleAdmittance } from './bank-sum';
import { type Branch, selfResonance_Hz } from './branch';
import { EngineError } from './errors';
import { type CompiledRail, railImpedance, scratch, seenImpedance } from './rail';

/** A refined sweep: parallel arrays over rising frequency. `slope` is d ln|Z| / d ln f. */
export interface Curve {
  frequency_Hz: Float64Array;
  re_ohm: Float64Array;
  im_ohm: Float64Array;
  logMagnitude: Float64Array;
  slope: Float64Array;
  /** Place in the samples that the sweep was made from (`sampleRail`); −1 for a point put in between. */
  sample: Int32Array;
}

export interface CurveOptions {
  /** Even spacing to start from, ≥ 60 so that a drawn curve looks smooth (engine sketch: 60 points a decade). */
  pointsPerDecade?: number;
  /** Largest departure from a cubic through neighbours, in nepers; 0.0005 Np = 0.0043 dB, under the 0.01 dB promised. */
  tolerance_Np?: number;
  /** Frequencies that must be among the points, e.g. the corners of a target mask. */
  include_Hz?: readonly number[];
  /** Samples made before by `sampleRail` for the same members and span, with this rail's counts set. */
  samples?: BankSum;
}

const MAX_DEPTH = 24;

/**
 * Sweeps |Z| over [low_Hz, high_Hz] so that no extremum is missed: an even grid in ln f, every self-resonance of a
 * branch, then halving wherever the middle departs from the cubic Hermite through both ends (value and slope are exact).
 * The skirts of a resonance fall like 1/δ and are never cubic, so a narrow peak is found from afar.
 * Throws EngineError for an empty or not finite band.
 */
export function sweepCurve(
  rail: CompiledRail,
  low_Hz: number,
  high_Hz: number,
  options: CurveOptions = {},
): Curve {
  if (!(low_Hz > 0) || !Number.isFinite(high_Hz))
    throw new EngineError('band_Hz', 'the band must lie above 0 Hz');
  if (!(high_Hz > low_Hz))
    throw new EngineError('band_Hz', 'the band is empty: its end must lie above its start');
  const tolerance = options.tolerance_Np ?? 5e-4;
  const out = scratch();
  const points: number[][] = [];
  const point = (f: number, sample: number): number[] => {
    const m2 = out[0] * out[0] + out[1] * out[1];
    const slope = (out[0] * out[2] + out[1] * out[3]) / m2;
    return [Math.log(f), f, out[0], out[1], 0.5 * Math.log(m2), slope, sample];
  };
  const at = (u: number): number[] => {
    const f = Math.exp(u);
    railImpedance(rail, f, out);
    return point(f, -1);
  };
  const samples = options.samples ?? sampleTotal(rail, low_Hz, high_Hz, options);
  const sampled = (i: number): number[] => {
    const { frequency_Hz, total } = samples;
    out[0] = total.g[i];
    out[1] = total.b[i];
    out[2] = total.dg[i];
    out[3] = total.db[i];
    seenImpedance(rail, frequency_Hz[i], out);
    return point(frequency_Hz[i], i);
  };
  const refine = (a: number[], b: number[], depth: number, middle?: number[]): void => {
    const h = b[0] - a[0];
    if (depth < MAX_DEPTH && h > 1e-9) {
      const mid = middle ?? at(0.5 * (a[0] + b[0]));
      const cubic = 0.5 * (a[4] + b[4]) + (h / 8) * (a[5] - b[5]);
      if (Math.abs(mid[4] - cubic) > tolerance || turnsTwice(a, mid, b)) {
        refine(a, mid, depth + 1);
        points.push(mid);
        refine(mid, b, depth + 1);
      }
    }
  };
  let previous = sampled(0);
  points.push(previous);
  for (let i = 2; i < samples.frequency_Hz.length; i += 2) {
    const next = sampled(i);
    refine(previous, next, 0, sampled(i - 1));
    points.push(next);
    previous = next;
  }
  const column = (k: number) => Float64Array.from(points, (p) => p[k]);
  return {
    frequency_Hz: column(1),
    re_ohm: column(2),
    im_ohm: column(3),
    logMagnitude: column(4),
    slope: column(5),
    sample: Int32Array.from(points, (p) => p[6]),
  };
}

/**
 * The members' admittances over the points that a sweep of [low_Hz, high_Hz] starts from, and between each two their middle
 * in ln f. Does not depend on counts: with `setCounts` the same samples serve a bank whose counts have changed.
 */
export function sampleRail(
  rail: CompiledRail,
  low_Hz: number,
  high_Hz: number,
  options: Omit<CurveOptions, 'samples'> = {},
): BankSum {
  const frequency_Hz = sampleGrid(rail, low_Hz, high_Hz, options);
  return new BankSum(
    frequency_Hz,
    rail.members.map((member) => sampleAdmittance(member.branch, frequency_Hz, member.id)),
    rail.members.map((member) => member.count),
  );
}

/** As `sampleRail`, when only the sum is asked for. */
function sampleTotal(
  rail: CompiledRail,
  low_Hz: number,
  high_Hz: number,
  options: Omit<CurveOptions, 'samples'>,
): Pick<BankSum, 'frequency_Hz' | 'total'> {
  const frequency_Hz = sampleGrid(rail, low_Hz, high_Hz, options);
  const total = blankSamples(frequency_Hz.length);
  for (const { branch, count, id } of rail.members)
    if (count > 0) addSamples(branch, count, frequency_Hz, total, id);
  return { frequency_Hz, total };
}

/** The points that a sweep starts from, and between each two their middle in ln f. */
function sampleGrid(
  rail: CompiledRail,
  low_Hz: number,
  high_Hz: number,
  options: Omit<CurveOptions, 'samples'>,
): Float64Array {
  const grid = startGrid(rail, low_Hz, high_Hz, options);
  const frequency_Hz = new Float64Array(2 * grid.length - 1);
  grid.forEach((f, i) => {
    frequency_Hz[2 * i] = f;
    if (i > 0) frequency_Hz[2 * i - 1] = Math.sqrt(grid[i - 1] * f);
  });
  return frequency_Hz;
}

/** Both ends slope one way and the middle the other: two extrema hide between the ends. */
function turnsTwice(a: number[], mid: number[], b: number[]): boolean {
  return a[5] > 0 === b[5] > 0 && mid[5] > 0 !== a[5] > 0 && Math.abs(mid[5]) > 1e-9;
}

function startGrid(rail: CompiledRail, low_Hz: number, high_Hz: number, options: CurveOptions): number[] {
  const perDecade = Math.max(options.pointsPerDecade ?? 60, 2);
  const decades = Math.log10(high_Hz / low_Hz);
  const steps = Math.max(2, Math.ceil(decades * perDecade));
  const grid: number[] = [low_Hz];
  for (let i = 1; i < steps; i++) grid.push(low_Hz * (high_Hz / low_Hz) ** (i / steps));
  grid.push(high_Hz);
  for (const member of rail.members) {
    const f = selfResonance_Hz(member.branch);
    if (f !== null) {
      // Without any resistance the branch's impedance is zero right there, which has no admittance: pass it on both sides.
      const isLossless = member.branch.kind === 'series' && member.branch.r === 0;
      const places = isLossless ? [f * (1 - 1e-7), f * (1 + 1e-7)] : [f];
      for (const place of places) if (place > low_Hz && place < high_Hz) grid.push(place);
    }
    for (const u of knotsOf(member.branch)) {
      const knot = Math.exp(u);
      if (knot > low_Hz && knot < high_Hz) grid.push(knot);
    }
  }
  for (const f of options.include_Hz ?? []) if (f > low_Hz && f < high_Hz) grid.push(f);
  grid.sort((a, b) => a - b);
  return grid.filter((f, i) => i === 0 || f > grid[i - 1]);
}

/** Where a table bends, in ln f. */
function knotsOf(branch: Branch): ArrayLike<number> & Iterable<number> {
  if (branch.kind === 'table') return branch.table.u;
  return branch.kind === 'lossy' ? branch.esr.u : [];
}

/** The stretch of a curve inside [low_Hz, high_Hz], whose ends must be among its points. */
export function partOf(curve: Curve, [low_Hz, high_Hz]: readonly [number, number]): Curve {
  const from = curve.frequency_Hz.findIndex((f) => f >= low_Hz);
  let to = curve.frequency_Hz.length;
  while (to > 0 && curve.frequency_Hz[to - 1] > high_Hz) to--;
  if (from < 0 || curve.frequency_Hz[from] !== low_Hz || curve.frequency_Hz[to - 1] !== high_Hz)
    throw new EngineError('band_Hz', 'the band’s ends are not among the points of the sweep');
  return {
    frequency_Hz: curve.frequency_Hz.subarray(from, to),
    re_ohm: curve.re_ohm.subarray(from, to),
    im_ohm: curve.im_ohm.subarray(from, to),
    logMagnitude: curve.logMagnitude.subarray(from, to),
    slope: curve.slope.subarray(from, to),
    sample: curve.sample.subarray(from, to),
  };
}

/** The curve with more points, computed exactly, e.g. its refined peaks. Frequencies that it has already are left alone. */
export function withPoints(rail: CompiledRail, curve: Curve, more_Hz: readonly number[]): Curve {
  const has = new Set(curve.frequency_Hz);
  const out = scratch();
  const rows = Array.from(curve.frequency_Hz, (f, i) => [
    f,
    curve.re_ohm[i],
    curve.im_ohm[i],
    curve.logMagnitude[i],
    curve.slope[i],
    curve.sample[i],
  ]);
  for (const f of new Set(more_Hz)) {
    if (has.has(f)) continue;
    railImpedance(rail, f, out);
    const m2 = out[0] * out[0] + out[1] * out[1];
    rows.push([f, out[0], out[1], 0.5 * Math.log(m2), (out[0] * out[2] + out[1] * out[3]) / m2, -1]);
  }
  rows.sort((a, b) => a[0] - b[0]);
  const column = (k: number) => Float64Array.from(rows, (row) => row[k]);
  return {
    frequency_Hz: column(0),
    re_ohm: column(1),
    im_ohm: column(2),
    logMagnitude: column(3),
    slope: column(4),
    sample: Int32Array.from(rows, (row) => row[5]),
  };
}
