import { branchAdmittance } from '../engine/branch';
import { HOLD_TOLERANCE } from '../engine/headroom';
import { targetAt } from '../engine/target';
import { conditionAt, viewAt } from './condition';
import type { Prepared } from './prepare';
import { tangentRows } from './tangent';

/**
 * The conditions of all grid frequencies as parallel arrays, one row each: q(Y) = a|Y|² + 2p·Y + d ≥ 0 with
 * Y = y0 + Σ n_k·y_k (`y0` holds what is fixed and every `min`). Rows of an inside-a-disk frequency (a < 0) are followed
 * by their tangents (a = 0), which every Y of that disk satisfies; the prunes read only rows with a ≥ 0.
 */
export interface Rows {
  size: number;
  frequency_Hz: Float64Array;
  a: Float64Array;
  px: Float64Array;
  py: Float64Array;
  d: Float64Array;
  zt: Float64Array;
  zsRe: Float64Array;
  zsIm: Float64Array;
  y0x: Float64Array;
  y0y: Float64Array;
  /** Per part (in prepared order) the admittance of one piece over the rows. */
  yx: Float64Array[];
  yy: Float64Array[];
  /** How far below zero a computed q may be rounding only; the prunes act beyond it. */
  margin: Float64Array;
  /** Rows that the prunes may read (a ≥ 0), and rows that decide whether a mix holds (the frequencies themselves). */
  convex: Int32Array;
  exact: Int32Array;
}

/**
 * A prune must never lose a mix that the engine accepts: rows ask for a target wider by this than the engine's own
 * tolerance, and what passes is verified by the engine before it is reported.
 */
const WIDER = 1 + 2 * HOLD_TOLERANCE;

/** Relative rounding of a sum of some hundred products, with three decades to spare. */
const ROUNDING = 1e-12;

/** Builds the rows of `frequencies_Hz` (in that order). */
export function buildRows(prepared: Prepared, frequencies_Hz: readonly number[]): Rows {
  const { rail, parts, problem } = prepared;
  const out = new Float64Array(4);
  const isPart = new Set(parts.map((part) => part.member));
  const list: number[][] = [];
  const columns: number[][] = parts.map(() => []);
  for (const f of frequencies_Hz) {
    const view = viewAt(rail, f);
    const c = conditionAt(view, targetAt(problem.target, f) * WIDER);
    let y0x = 0;
    let y0y = 0;
    rail.members.forEach((member, index) => {
      if (isPart.has(index) || member.count === 0) return;
      branchAdmittance(member.branch, f, out, member.id);
      y0x += member.count * out[0];
      y0y += member.count * out[1];
    });
    const y: number[] = [];
    let reach = 0;
    for (const part of parts) {
      branchAdmittance(part.branch, f, out, part.id);
      y.push(out[0], out[1]);
      y0x += part.min * out[0];
      y0y += part.min * out[1];
      reach += part.max * Math.hypot(out[0], out[1]);
    }
    reach += Math.hypot(y0x, y0y);
    const conditions = c.a < 0 ? [c, ...tangentRows(c)] : [c];
    for (const row of conditions) {
      const terms =
        1 + Math.abs(row.a) * reach * reach + 2 * Math.hypot(row.px, row.py) * reach + Math.abs(row.d);
      list.push([f, row.a, row.px, row.py, row.d, row.zt, view.zsRe, view.zsIm, y0x, y0y, ROUNDING * terms]);
      parts.forEach((_, k) => {
        columns[k].push(y[2 * k], y[2 * k + 1]);
      });
    }
  }
  const column = (i: number) => Float64Array.from(list, (row) => row[i]);
  const indices = list.map((_, i) => i);
  return {
    size: list.length,
    frequency_Hz: column(0),
    a: column(1),
    px: column(2),
    py: column(3),
    d: column(4),
    zt: column(5),
    zsRe: column(6),
    zsIm: column(7),
    y0x: column(8),
    y0y: column(9),
    margin: column(10),
    yx: columns.map((c) => Float64Array.from({ length: list.length }, (_, i) => c[2 * i])),
    yy: columns.map((c) => Float64Array.from({ length: list.length }, (_, i) => c[2 * i + 1])),
    convex: Int32Array.from(indices.filter((i) => list[i][1] >= 0)),
    exact: Int32Array.from(indices.filter((i) => i === 0 || list[i][0] !== list[i - 1][0])),
  };
}

/** q of row `f` at Y = x + jy. */
export function rowQuadratic(rows: Rows, f: number, x: number, y: number): number {
  return rows.a[f] * (x * x + y * y) + 2 * (rows.px[f] * x + rows.py[f] * y) + rows.d[f];
}

/** φ of row `f` times Zt, dimensionless; convex in Y where a ≥ 0 (see condition.ts). */
export function rowMeasure(rows: Rows, f: number, x: number, y: number): number {
  const ax = rows.a[f] * x + rows.px[f];
  const ay = rows.a[f] * y + rows.py[f];
  return rowQuadratic(rows, f, x, y) / (Math.sqrt(ax * ax + ay * ay) / rows.zt[f] + 1);
}

/** True when Y (over the rows) meets every frequency's own condition, up to rounding. */
export function meetsAll(rows: Rows, x: Float64Array, y: Float64Array): boolean {
  const { exact } = rows;
  for (let j = 0; j < exact.length; j++) {
    const f = exact[j];
    const slack = 10 * ROUNDING * (1 + Math.abs(rows.a[f]) * (x[f] * x[f] + y[f] * y[f]));
    if (rowQuadratic(rows, f, x[f], y[f]) < -slack) return false;
  }
  return true;
}
