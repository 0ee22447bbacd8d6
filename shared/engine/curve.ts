import { selfResonance_Hz } from './branch';
import { EngineError } from './errors';
import { type CompiledRail, railImpedance, scratch } from './rail';

/** A refined sweep: parallel arrays over rising frequency. `slope` is d ln|Z| / d ln f. */
export interface Curve {
  frequency_Hz: Float64Array;
  re_ohm: Float64Array;
  im_ohm: Float64Array;
  logMagnitude: Float64Array;
  slope: Float64Array;
}

export interface CurveOptions {
  /** Even spacing to start from, ≥ 60 so that a drawn curve looks smooth (engine sketch: 60 points a decade). */
  pointsPerDecade?: number;
  /** Largest departure from a cubic through neighbours, in nepers; 0.0005 Np = 0.0043 dB, under the 0.01 dB promised. */
  tolerance_Np?: number;
  /** Frequencies that must be among the points, e.g. the corners of a target mask. */
  include_Hz?: readonly number[];
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
  const at = (u: number, f: number): number[] => {
    railImpedance(rail, f, out);
    const m2 = out[0] * out[0] + out[1] * out[1];
    const slope = (out[0] * out[2] + out[1] * out[3]) / m2;
    return [u, f, out[0], out[1], 0.5 * Math.log(m2), slope];
  };
  const refine = (a: number[], b: number[], depth: number): void => {
    const h = b[0] - a[0];
    if (depth < MAX_DEPTH && h > 1e-9) {
      const u = 0.5 * (a[0] + b[0]);
      const mid = at(u, Math.exp(u));
      const cubic = 0.5 * (a[4] + b[4]) + (h / 8) * (a[5] - b[5]);
      if (Math.abs(mid[4] - cubic) > tolerance || turnsTwice(a, mid, b)) {
        refine(a, mid, depth + 1);
        points.push(mid);
        refine(mid, b, depth + 1);
      }
    }
  };
  const grid = startGrid(rail, low_Hz, high_Hz, options);
  let previous = at(Math.log(grid[0]), grid[0]);
  points.push(previous);
  for (let i = 1; i < grid.length; i++) {
    const next = at(Math.log(grid[i]), grid[i]);
    refine(previous, next, 0);
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
  };
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
    const f = member.count > 0 ? selfResonance_Hz(member.branch) : null;
    if (f !== null && f > low_Hz && f < high_Hz) grid.push(f);
    if (member.branch.kind === 'table')
      for (const u of member.branch.table.u) {
        const knot = Math.exp(u);
        if (knot > low_Hz && knot < high_Hz) grid.push(knot);
      }
  }
  for (const f of options.include_Hz ?? []) if (f > low_Hz && f < high_Hz) grid.push(f);
  grid.sort((a, b) => a - b);
  return grid.filter((f, i) => i === 0 || f > grid[i - 1]);
}
