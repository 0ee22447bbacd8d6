import { type Rows, rowMeasure } from './rows';

/** Non-negative weights on a few rows: `row[j]` counts `weight[j]`. */
export interface Surrogate {
  row: Int32Array;
  weight: Float64Array;
  /** The corner that saved the last node; tried first at the next. */
  lastSaved: number;
}

/**
 * **Surrogate test.** With t_k = w_k·m_k/b as in the hull test, any completion is Y' = (1 − Σt_k)·Y + Σ t_k·V_k with corners
 * V_k = Y + (b/w_k)·y_k. Every φ_f is convex (condition.ts), so
 *   φ_f(Y') ≤ (1 − Σt_k)·φ_f(Y) + Σ t_k·φ_f(V_k):
 * linear interpolation over a simplex is the least concave function above a convex one. Sum over rows with any λ ≥ 0:
 *   Σ_f λ_f·φ_f(Y') ≤ max over corners V of Σ_f λ_f·φ_f(V).
 * A completion that holds has φ_f(Y') ≥ 0 at every f; so if Σ λ_f·φ_f(V) < 0 at every corner, the node may be cut. One row
 * with λ = 1 is the hull test; by the triangle inequality this is never weaker than Σ λ(r − |Y − c|) ≤ b·max Σ λ|y_k|/w_k,
 * since it keeps the phase between Y and y_k. Any λ ≥ 0 is valid, however it was found; `game.ts` finds the best.
 */
export function surrogatePrune(
  rows: Rows,
  parts: ArrayLike<number>,
  weights: ArrayLike<number>,
  x: Float64Array,
  y: Float64Array,
  budget: number,
  surrogate: Surrogate,
): boolean {
  const { row, weight } = surrogate;
  const slack = slackOf(rows, surrogate);
  const count = parts.length;
  // corner −1 is Y itself; the last one to save a node goes first
  const first = surrogate.lastSaved < count ? surrogate.lastSaved : -1;
  for (let c = -2; c < count; c++) {
    const corner = c === -2 ? first : c;
    if (c !== -2 && c === first) continue;
    let sum = 0;
    if (corner < 0) {
      for (let j = 0; j < row.length; j++) sum += weight[j] * rowMeasure(rows, row[j], x[row[j]], y[row[j]]);
    } else {
      const k = parts[corner];
      const scale = budget / weights[k];
      const kx = rows.yx[k];
      const ky = rows.yy[k];
      for (let j = 0; j < row.length; j++) {
        const f = row[j];
        sum += weight[j] * rowMeasure(rows, f, x[f] + scale * kx[f], y[f] + scale * ky[f]);
      }
    }
    if (sum >= -slack) {
      surrogate.lastSaved = corner;
      return false;
    }
  }
  return true;
}

function slackOf(rows: Rows, { row, weight }: Surrogate): number {
  let slack = 0;
  for (let j = 0; j < row.length; j++) slack += weight[j] * rows.margin[row[j]];
  return slack;
}
