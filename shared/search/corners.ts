import type { Prepared } from './prepare';
import { type Rows, rowMeasure } from './rows';

/**
 * The simplex of all mixes of weight ≤ budget, by its corners: corner 0 spends nothing beyond the minima, corner k + 1 all on
 * part k. A mix is a weighting t of the corners (t ≥ 0, Σ t = 1) with n_k = t_(k+1)·left/w_k. Holds Y at every corner and row.
 */
export class Corners {
  readonly count: number;
  /** Budget beyond the minima. */
  readonly left: number;
  /** Y of corner c at row f: index f·count + c. */
  readonly x: Float64Array;
  readonly y: Float64Array;
  private readonly weights: Float64Array;

  constructor(prepared: Prepared, rows: Rows, budget: number) {
    const m = prepared.parts.length + 1;
    this.count = m;
    this.left = budget - prepared.baseWeight;
    this.weights = Float64Array.from(prepared.parts, (part) => part.weight);
    this.x = new Float64Array(rows.size * m);
    this.y = new Float64Array(rows.size * m);
    for (let f = 0; f < rows.size; f++) {
      this.x[f * m] = rows.y0x[f];
      this.y[f * m] = rows.y0y[f];
      for (let k = 0; k + 1 < m; k++) {
        this.x[f * m + k + 1] = rows.y0x[f] + this.most(k) * rows.yx[k][f];
        this.y[f * m + k + 1] = rows.y0y[f] + this.most(k) * rows.yy[k][f];
      }
    }
  }

  /** So many pieces of part k would use the whole budget. */
  most(k: number): number {
    return this.left / this.weights[k];
  }

  /** φ of every convex row at the mix `t` into `out` (by row number); returns the smallest. */
  measure(rows: Rows, t: Float64Array, out: Float64Array): number {
    const m = this.count;
    let least = Number.POSITIVE_INFINITY;
    for (let j = 0; j < rows.convex.length; j++) {
      const f = rows.convex[j];
      let x = 0;
      let y = 0;
      for (let c = 0, at = f * m; c < m; c++, at++) {
        x += t[c] * this.x[at];
        y += t[c] * this.y[at];
      }
      out[f] = rowMeasure(rows, f, x, y);
      if (out[f] < least) least = out[f];
    }
    return least;
  }
}
