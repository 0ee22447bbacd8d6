import type { Rows } from './rows';

/**
 * For each row the corners of the convex hull of 0 and of y_k/w_k over a list of parts: what one unit of weight can add to Y.
 * Scaled by the budget and moved to Y it is the hull of all that the list can still reach (see hull-prune.ts). Corners of
 * row f are `start[f] … start[f + 1] − 1`; 0 itself is not stored. Inner points never are the furthest from any centre, so
 * of 16 parts some 4 to 6 corners remain.
 */
export interface HullTable {
  start: Int32Array;
  x: Float64Array;
  y: Float64Array;
}

/** Hull corners of `parts` (indices) for every row. */
export function buildHulls(rows: Rows, weights: ArrayLike<number>, parts: ArrayLike<number>): HullTable {
  const start = new Int32Array(rows.size + 1);
  const xs: number[] = [];
  const ys: number[] = [];
  for (let f = 0; f < rows.size; f++) {
    const points: [number, number][] = [[0, 0]];
    for (let j = 0; j < parts.length; j++) {
      const k = parts[j];
      points.push([rows.yx[k][f] / weights[k], rows.yy[k][f] / weights[k]]);
    }
    for (const [x, y] of convexHull(points)) {
      if (x === 0 && y === 0) continue;
      xs.push(x);
      ys.push(y);
    }
    start[f + 1] = xs.length;
  }
  return { start, x: Float64Array.from(xs), y: Float64Array.from(ys) };
}

/** Corners of the convex hull, counter-clockwise (Andrew's monotone chain). */
export function convexHull(points: readonly [number, number][]): [number, number][] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  if (sorted.length < 3) return sorted;
  const half = (list: readonly [number, number][]): [number, number][] => {
    const chain: [number, number][] = [];
    for (const p of list) {
      while (chain.length > 1 && turn(chain[chain.length - 2], chain[chain.length - 1], p) <= 0) chain.pop();
      chain.push(p);
    }
    chain.pop();
    return chain;
  };
  return [...half(sorted), ...half(sorted.reverse())];
}

function turn(
  o: readonly [number, number],
  a: readonly [number, number],
  b: readonly [number, number],
): number {
  return (a[0] - o[0]) * (b[1] - o[1]) - (a[1] - o[1]) * (b[0] - o[0]);
}
