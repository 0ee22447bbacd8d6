import type { Prepared } from './prepare';
import { type Rows, rowQuadratic } from './rows';

/** The best that all candidates together can do at one row: the largest q, and the Y and counts that give it. */
export interface Reach {
  row: number;
  best: number;
  x: number;
  y: number;
  /** Pieces in use there, beyond the minima. */
  counts: number[];
}

/**
 * **Reach test.** With 0 ≤ n_k ≤ m_k the reachable Y of one frequency form a zonotope. For a ≥ 0 q is convex, so its
 * maximum is at a corner of the zonotope, and every corner takes each y_k either not at all or m_k times, on one side of
 * some line through the origin: it is enough to try both sides of the line along each y_k, with what lies along the line
 * itself in or out.
 * If q < 0 there, no mix within the maxima meets that frequency, whatever its weight or its kinds.
 */
export function reachAt(prepared: Prepared, rows: Rows, row: number): Reach {
  const { parts } = prepared;
  const gx = parts.map((part, k) => (part.max - part.min) * rows.yx[k][row]);
  const gy = parts.map((part, k) => (part.max - part.min) * rows.yy[k][row]);
  const reach: Reach = { row, best: Number.NEGATIVE_INFINITY, x: 0, y: 0, counts: [] };
  const tryCorner = (isIn: (k: number) => boolean): void => {
    let x = rows.y0x[row];
    let y = rows.y0y[row];
    for (let k = 0; k < parts.length; k++) {
      if (!isIn(k)) continue;
      x += gx[k];
      y += gy[k];
    }
    const q = rowQuadratic(rows, row, x, y);
    if (q <= reach.best) return;
    Object.assign(reach, { best: q, x, y });
    reach.counts = parts.map((part, k) => (isIn(k) ? part.max - part.min : 0));
  };
  tryCorner(() => false);
  tryCorner(() => true);
  for (let j = 0; j < parts.length; j++) {
    const cross = (k: number): number => gx[j] * gy[k] - gy[j] * gx[k];
    const along = (k: number): number => gx[j] * gx[k] + gy[j] * gy[k];
    for (const side of [1, -1]) {
      for (const way of [1, -1])
        tryCorner((k) => side * cross(k) > 0 || (cross(k) === 0 && way * along(k) > 0));
    }
  }
  return reach;
}

/** Everything at its maximum is enough there: the usual case, told at once. */
function isReachedByAll({ parts }: Prepared, rows: Rows, row: number): boolean {
  let x = rows.y0x[row];
  let y = rows.y0y[row];
  parts.forEach((part, k) => {
    x += (part.max - part.min) * rows.yx[k][row];
    y += (part.max - part.min) * rows.yy[k][row];
  });
  return rowQuadratic(rows, row, x, y) >= 0;
}

/** The row that the candidates miss by most though all are at their maximum; null when each frequency is within reach. */
export function outOfReach(prepared: Prepared, rows: Rows): Reach | null {
  let worst: Reach | null = null;
  for (const row of rows.convex) {
    if (isReachedByAll(prepared, rows, row)) continue;
    const reach = reachAt(prepared, rows, row);
    if (reach.best < -rows.margin[row] && (!worst || reach.best < worst.best)) worst = reach;
  }
  return worst;
}
