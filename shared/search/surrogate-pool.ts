import { Game } from './game';
import { type Rows, rowMeasure } from './rows';
import { type Surrogate, surrogatePrune } from './surrogate-prune';

/** Of so many nodes that all known tests leave alive, one has its own game solved (some 0.1 ms, thus about a third of the time). */
const SAMPLE = 128;
/** Surrogates kept per level; the one that cut last stands first. */
const KEEP = 8;

/**
 * Surrogates learned along the way, per level of the tree: neighbours fail for the same reasons, so a handful of λ found at
 * sampled nodes cuts nearly as much as the best λ of every node (measured on search cases 1 and 2: 1.2 × the nodes at
 * 1/20 of the cost). Which nodes are sampled is decided by a fixed sequence, so a search repeats exactly.
 */
export class SurrogatePool {
  private rows: Rows;
  private readonly weights: Float64Array;
  private readonly levels: Surrogate[][];
  private game: Game;
  private phi: Float64Array;
  private dice = 1;

  constructor(rows: Rows, weights: Float64Array) {
    this.rows = rows;
    this.weights = weights;
    this.levels = Array.from(weights, () => []);
    this.game = new Game(rows.convex.length);
    this.phi = new Float64Array((weights.length + 1) * rows.convex.length);
  }

  /** New rows have been appended; what is known of the old ones stays true. */
  setRows(rows: Rows): void {
    this.rows = rows;
    this.game = new Game(rows.convex.length);
    this.phi = new Float64Array((this.weights.length + 1) * rows.convex.length);
  }

  /** True when some known surrogate, or now and then the node's own best one, cuts the node. `force`: solve it in any case. */
  prune(
    level: number,
    parts: Int32Array,
    x: Float64Array,
    y: Float64Array,
    budget: number,
    force: boolean,
  ): boolean {
    const known = this.levels[level];
    for (let j = 0; j < known.length; j++) {
      const surrogate = known[j];
      if (!surrogatePrune(this.rows, parts, this.weights, x, y, budget, surrogate)) continue;
      for (let m = j; m > 0; m--) known[m] = known[m - 1];
      known[0] = surrogate;
      return true;
    }
    this.dice = (Math.imul(this.dice, 1103515245) + 12345) & 0x7fffffff;
    if (!force && (this.dice >> 8) % SAMPLE !== 0) return false;
    const made = this.solve(parts, x, y, budget);
    if (!surrogatePrune(this.rows, parts, this.weights, x, y, budget, made)) return false;
    known.unshift(made);
    if (known.length > KEEP) known.pop();
    return true;
  }

  private solve(parts: Int32Array, x: Float64Array, y: Float64Array, budget: number): Surrogate {
    const { rows, phi, weights } = this;
    const { convex } = rows;
    const n = convex.length;
    for (let j = 0; j < n; j++) phi[j] = rowMeasure(rows, convex[j], x[convex[j]], y[convex[j]]);
    for (let c = 0; c < parts.length; c++) {
      const k = parts[c];
      const scale = budget / weights[k];
      const kx = rows.yx[k];
      const ky = rows.yy[k];
      const at = (c + 1) * n;
      for (let j = 0; j < n; j++) {
        const f = convex[j];
        phi[at + j] = rowMeasure(rows, f, x[f] + scale * kx[f], y[f] + scale * ky[f]);
      }
    }
    this.game.solve(phi, parts.length + 1);
    const used = Array.from(convex.keys()).filter((j) => this.game.lambda[j] > 1e-9);
    return {
      row: Int32Array.from(used, (j) => convex[j]),
      weight: Float64Array.from(used, (j) => this.game.lambda[j]),
      lastSaved: -1,
    };
  }
}
