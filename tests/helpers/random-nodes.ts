import { prepare } from '@shared/search/prepare';
import { seededRandom } from '@shared/search/random';
import { buildRows, type Rows } from '@shared/search/rows';
import { type SmallOptions, smallSearch } from './small-search';

/** A random node of a small search: partial sum over the rows, open parts, weights and the budget left. */
export interface RandomNode {
  rows: Rows;
  weights: Float64Array;
  open: Int32Array;
  x: Float64Array;
  y: Float64Array;
  budget: number;
  random: () => number;
}

/** `frequencies` rows (more where a tangent stands in), a random partial bank, and a random tail of parts still open. */
export function randomNode(seed: number, options: SmallOptions, frequencies = 25): RandomNode {
  const random = seededRandom(seed * 31 + 7);
  const problem = smallSearch(seed, options);
  const prepared = prepare(problem);
  const [low, high] = problem.band_Hz;
  const grid = Array.from({ length: frequencies }, (_, i) => low * (high / low) ** (i / (frequencies - 1)));
  const rows = buildRows(prepared, grid);
  const first = Math.floor(random() * prepared.parts.length);
  const x = rows.y0x.slice();
  const y = rows.y0y.slice();
  for (let k = 0; k <= first; k++) addPieces(rows, k, Math.floor(random() * 4), x, y);
  const open = Int32Array.from(prepared.parts.keys()).filter((k) => k >= first);
  const weights = Float64Array.from(prepared.parts, (part) => part.weight);
  const heaviest = Math.max(...weights);
  return { rows, weights, open, x, y, budget: heaviest * (0.5 + 4 * random()), random };
}

/** Adds `count` pieces of part k to Y. */
export function addPieces(rows: Rows, k: number, count: number, x: Float64Array, y: Float64Array): void {
  for (let f = 0; f < rows.size; f++) {
    x[f] += count * rows.yx[k][f];
    y[f] += count * rows.yy[k][f];
  }
}

/** Calls `visit` with Y of every whole-number completion of the node within its budget. */
export function eachCompletion(node: RandomNode, visit: (x: Float64Array, y: Float64Array) => void): void {
  const { rows, open, weights } = node;
  const fill = (j: number, left: number, x: Float64Array, y: Float64Array): void => {
    if (j === open.length) {
      visit(x, y);
      return;
    }
    for (let n = 0; n * weights[open[j]] <= left + 1e-12; n++) {
      const nx = x.slice();
      const ny = y.slice();
      addPieces(rows, open[j], n, nx, ny);
      fill(j + 1, left - n * weights[open[j]], nx, ny);
    }
  };
  fill(0, node.budget, node.x, node.y);
}

/** The settings over which the prunes are tried: both observation points, reachable and unreachable targets. */
export const NODE_OPTIONS: SmallOptions[] = [
  { kinds: 3 },
  { kinds: 3, ease: 0.8 },
  { kinds: 4, observe: 'die', minimise: 'area' },
  { kinds: 3, observe: 'die', ease: 0.35 },
  { kinds: 3, mask: true, minimise: 'cost', ease: 0.6 },
];
