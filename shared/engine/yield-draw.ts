import type { Branch } from './branch';
import { surfaceMaxima } from './headroom';
import { addAdmittance } from './impedance-over';
import { logImpedance } from './peaks';
import { type CompiledRail, scratch, seenImpedance } from './rail';
import { type TargetMask, targetAt, targetSegment } from './target';

/** The branch with C, ESR scaled and `added_H` more ESL. A table keeps its shape and has the change put in series. */
export function withFactors(branch: Branch, c: number, r: number, added_H: number): Branch {
  switch (branch.kind) {
    case 'series':
      return { kind: 'series', r: branch.r * r, l: branch.l + added_H, d: branch.d / c };
    case 'lossy': {
      const up = Math.log(r);
      const esr = { u: branch.esr.u, logR: branch.esr.logR.map((value) => value + up) };
      return { kind: 'lossy', esr, l: branch.l + added_H, d: branch.d / c };
    }
    case 'table': {
      const d = (branch.table.fit.elastance_perF + branch.d) * (1 / c - 1) + branch.d;
      return { ...branch, rScale: branch.rScale * r, l: branch.l + added_H, d };
    }
    case 'damped':
      return branch;
  }
}

/** Where every draw is looked at. */
export interface DrawGrid {
  frequency_Hz: Float64Array;
  omega: Float64Array;
  inverseOmega: Float64Array;
  logTarget: Float64Array;
}

/** Points a decade that every draw is looked at; between them the highest are refined. */
const PER_DECADE = 60;

/** An even grid, the target's corners, and every maximum of the rail as compiled. */
export function drawGrid(
  rail: CompiledRail,
  [low, high]: readonly [number, number],
  target: TargetMask,
): DrawGrid {
  const steps = Math.max(2, Math.ceil(Math.log10(high / low) * PER_DECADE));
  const points = Array.from({ length: steps + 1 }, (_, i) =>
    i === steps ? high : low * (high / low) ** (i / steps),
  );
  points.push(...Array.from(target.frequency_Hz).filter((f) => f > low && f < high));
  points.push(...surfaceMaxima(rail, [low, high], target).map((one) => one.frequency_Hz));
  const frequency_Hz = Float64Array.from(new Set(points)).sort();
  const omega = frequency_Hz.map((f) => 2 * Math.PI * f);
  return {
    frequency_Hz,
    omega,
    inverseOmega: omega.map((w) => 1 / w),
    logTarget: frequency_Hz.map((f) => Math.log(targetAt(target, f))),
  };
}

/** Conductance and susceptance over the grid. */
export interface Sum {
  g: Float64Array;
  b: Float64Array;
}

/** Admittance of some members over the grid, on top of `start`. */
export function sumOf(members: CompiledRail['members'], grid: DrawGrid, start?: Sum): Sum {
  const n = grid.frequency_Hz.length;
  const sum = start
    ? { g: start.g.slice(), b: start.b.slice() }
    : { g: new Float64Array(n), b: new Float64Array(n) };
  for (const { branch, count } of members)
    if (count > 0) addAdmittance(branch, count, grid.omega, grid.inverseOmega, sum);
  return sum;
}

/** So many of the grid's tops are refined at least, and all that come this near (nepers) to the highest. */
const REFINED = 3;
const NEAR_NP = 0.5;

/** Headroom in dB at the tightest place of one draw: the grid's highest points, refined. */
export function tightestOnGrid(
  rail: CompiledRail,
  moving: ReadonlySet<number>,
  still: Sum,
  grid: DrawGrid,
  target: TargetMask,
): number {
  const { g, b } = sumOf(
    rail.members.filter((_, k) => moving.has(k)),
    grid,
    still,
  );
  const n = g.length;
  const out = scratch();
  const value = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    out[0] = g[i];
    out[1] = b[i];
    if (rail.view) {
      out[2] = 0;
      out[3] = 0;
      seenImpedance(rail, grid.frequency_Hz[i], out);
      value[i] = 0.5 * Math.log(out[0] * out[0] + out[1] * out[1]) - grid.logTarget[i];
    } else value[i] = -0.5 * Math.log(g[i] * g[i] + b[i] * b[i]) - grid.logTarget[i];
  }
  const tops: number[] = [];
  for (let i = 0; i < n; i++)
    if ((i === 0 || value[i] >= value[i - 1]) && (i === n - 1 || value[i] >= value[i + 1])) tops.push(i);
  tops.sort((p, q) => value[q] - value[p]);
  let highest = value[tops[0]];
  const near = tops.filter((i, k) => k < REFINED || value[i] > highest - NEAR_NP);
  for (const i of near) if (i > 0 && i < n - 1) highest = Math.max(highest, refine(rail, grid, target, i));
  return -highest * (20 / Math.LN10);
}

const HALVINGS = 12;

/** The highest of ln|Z| − ln Z_t between a top's neighbours, by its slope. */
function refine(rail: CompiledRail, grid: DrawGrid, target: TargetMask, i: number): number {
  const z = logImpedance(rail);
  let low = Math.log(grid.frequency_Hz[i - 1]);
  let high = Math.log(grid.frequency_Hz[i + 1]);
  let highest = Number.NEGATIVE_INFINITY;
  for (let k = 0; k < HALVINGS; k++) {
    const u = 0.5 * (low + high);
    const curve = z(u);
    const line = targetSegment(target, Math.exp(u));
    highest = Math.max(highest, curve.value - line.logValue);
    if (curve.slope > line.slope) low = u;
    else high = u;
  }
  return highest;
}
