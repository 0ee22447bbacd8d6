import type { HullTable } from './hull';
import type { Rows } from './rows';

/**
 * **Hull test.** Let Y be the partial sum and b the budget left. Whatever may still be added, Σ m_k·y_k with m_k ≥ 0 and
 * Σ w_k·m_k ≤ b, is a convex combination of 0 and the points (b/w_k)·y_k: put t_k = w_k·m_k/b ≥ 0, Σ t_k ≤ 1. So the final
 * admittance lies in the hull H of Y and Y + b·(y_k/w_k). For a ≥ 0 the condition's q is convex, hence its maximum over H is
 * at a corner of H; if q < 0 at every corner, no completion meets that row and the node may be cut.
 *
 * Returns the row that cuts, or −1. Rows are tried in the order of `order`, and the one that cuts moves to its front: the
 * next node is a neighbour and most often fails at the same frequency. `margin` keeps rounding from cutting a true solution.
 */
export function hullPrune(
  rows: Rows,
  hulls: HullTable,
  x: Float64Array,
  y: Float64Array,
  budget: number,
  order: Int32Array,
): number {
  const { a, px, py, d, margin } = rows;
  const { start, x: hx, y: hy } = hulls;
  const n = order.length;
  for (let j = 0; j < n; j++) {
    const f = order[j];
    const af = a[f];
    const pxf = 2 * px[f];
    const pyf = 2 * py[f];
    const yx = x[f];
    const yy = y[f];
    const least = -margin[f] - d[f];
    if (af * (yx * yx + yy * yy) + pxf * yx + pyf * yy >= least) continue;
    let v = start[f];
    const end = start[f + 1];
    for (; v < end; v++) {
      const cx = yx + budget * hx[v];
      const cy = yy + budget * hy[v];
      if (af * (cx * cx + cy * cy) + pxf * cx + pyf * cy >= least) break;
    }
    if (v === end) {
      for (let m = j; m > 0; m--) order[m] = order[m - 1];
      order[0] = f;
      return f;
    }
  }
  return -1;
}
