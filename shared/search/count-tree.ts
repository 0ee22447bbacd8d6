import { buildHulls, type HullTable } from './hull';
import { hullPrune } from './hull-prune';
import type { Prepared } from './prepare';
import { meetsAll, type Rows } from './rows';
import { SurrogatePool } from './surrogate-pool';

/** So many points sorted into hulls are enough for one call of `run` (some 10 ms); the tables are made as levels are reached. */
const MOST_BUILT = 30_000;

export type CountState = 'more' | 'found' | 'done';

/**
 * Depth-first branch and bound over the counts, parts by rising self-resonance. A node (i, n_0 … n_i) has settled the parts
 * before i and at least n_i of part i; parts i … K−1 are open. It is tested with all that is open, then its first child settles
 * part i at n_i and opens only i+1 … K−1, its second adds one more of part i. In this order what is still open resonates
 * higher than what is settled: below its resonances it is all capacitive, so its phases agree and the bounds bite, and a gap
 * between settled parts that nothing open can fill is seen at once.
 *
 * The machine keeps the path as counts, so it can stop after any number of nodes, be told a smaller budget, or be given
 * more rows, and go on from where it was. One pass with budget B either finds a mix of weight ≤ B or proves that none exists.
 */
export class CountTree {
  nodes = 0;
  budget = 0;
  readonly counts: Int32Array;
  private readonly prepared: Prepared;
  private rows: Rows;
  private x: Float64Array[] = [];
  private y: Float64Array[] = [];
  private order = new Int32Array(0);
  private readonly used: Float64Array;
  private readonly kinds: Int32Array;
  private readonly weights: Float64Array;
  private hulls: (HullTable | undefined)[] = [];
  private readonly lists: (Int32Array | undefined)[] = [];
  private readonly pool: SurrogatePool;
  private level = 0;
  private firstNode = 1;
  private built = 0;
  /** After 'found': 'cut' the node (its completions weigh more), or look 'below' it (the engine refused the mix itself). */
  private next: 'test' | 'cut' | 'below' = 'test';

  constructor(prepared: Prepared, rows: Rows) {
    const k = prepared.parts.length;
    this.prepared = prepared;
    this.counts = new Int32Array(k);
    this.used = new Float64Array(k);
    this.kinds = new Int32Array(k);
    this.weights = Float64Array.from(prepared.parts, (part) => part.weight);
    this.rows = rows;
    this.pool = new SurrogatePool(rows, this.weights);
    this.setRows(rows);
  }

  /** Starts a pass for mixes of weight ≤ `budget` (prepared units). */
  start(budget: number): void {
    this.budget = budget;
    this.counts.fill(0);
    this.level = 0;
    this.next = 'test';
    this.firstNode = this.nodes + 1;
    this.used[0] = this.prepared.baseWeight;
    this.kinds[0] = this.prepared.baseKinds;
    this.x[0].set(this.rows.y0x);
    this.y[0].set(this.rows.y0y);
  }

  /** Replaces the rows (frequencies have joined) and sums the present path anew. */
  setRows(rows: Rows): void {
    this.rows = rows;
    this.hulls = [];
    this.order = rows.convex.slice();
    this.pool.setRows(rows);
    this.x = this.prepared.parts.map(() => rows.y0x.slice());
    this.y = this.prepared.parts.map(() => rows.y0y.slice());
    for (let i = 0; i <= this.level; i++) {
      if (i > 0) {
        this.x[i].set(this.x[i - 1]);
        this.y[i].set(this.y[i - 1]);
      }
      for (let n = 0; n < this.counts[i]; n++) this.addPiece(i);
    }
  }

  /** Works on `limit` nodes at most. After 'found' (`mix()` holds on all rows) say `accept` or `reject`, then go on. */
  run(limit: number): CountState {
    const last = this.counts.length - 1;
    const end = this.nodes + limit;
    this.built = 0;
    while (this.nodes < end && this.built < MOST_BUILT) {
      const i = this.level;
      let pruned = this.next === 'cut';
      if (this.next === 'test') {
        this.nodes++;
        pruned = this.used[i] > this.budget || this.isPruned(i);
        if (!pruned && meetsAll(this.rows, this.x[i], this.y[i])) return 'found';
      }
      this.next = 'test';
      if (!pruned && i < last) this.open(i + 1);
      else if (!this.advance(pruned)) return 'done';
    }
    return 'more';
  }

  /** The mix found is taken; from here on only mixes of weight ≤ `budget` are looked for. */
  accept(budget: number): void {
    this.budget = budget;
    this.next = 'cut';
  }

  /** A lighter mix is known from elsewhere. */
  lower(budget: number): void {
    this.budget = Math.min(this.budget, budget);
  }

  /** The engine refused the mix found (after `setRows`, if it named frequencies): its completions may still hold. */
  reject(): void {
    this.next = 'below';
  }

  /** The present path's counts with the minima, in prepared order. */
  mix(): Int32Array {
    return Int32Array.from(this.counts, (n, k) => (k <= this.level ? n : 0) + this.prepared.parts[k].min);
  }

  private open(i: number): void {
    this.x[i].set(this.x[i - 1]);
    this.y[i].set(this.y[i - 1]);
    this.used[i] = this.used[i - 1];
    this.kinds[i] = this.kinds[i - 1];
    this.counts[i] = 0;
    this.level = i;
  }

  /** To the next node after one that is exhausted; false when the pass is over. */
  private advance(pruned: boolean): boolean {
    let closed = pruned;
    for (;;) {
      const i = this.level;
      if (!closed && this.canAdd(i)) {
        if (this.counts[i] === 0 && this.prepared.parts[i].min === 0) this.kinds[i]++;
        this.counts[i]++;
        this.used[i] += this.weights[i];
        this.addPiece(i);
        return true;
      }
      if (i === 0) return false;
      this.level = i - 1;
      closed = false;
    }
  }

  private canAdd(i: number): boolean {
    const part = this.prepared.parts[i];
    if (this.counts[i] + part.min >= part.max) return false;
    if (this.used[i] + this.weights[i] > this.budget) return false;
    return this.counts[i] > 0 || part.min > 0 || this.kinds[i] < this.prepared.maxKinds;
  }

  private addPiece(i: number): void {
    const x = this.x[i];
    const y = this.y[i];
    const px = this.rows.yx[i];
    const py = this.rows.yy[i];
    for (let f = 0; f < x.length; f++) {
      x[f] += px[f];
      y[f] += py[f];
    }
  }

  private isPruned(i: number): boolean {
    const left = this.budget - this.used[i];
    const list = this.listOf(i);
    const hulls = this.hullsOf(list);
    if (hullPrune(this.rows, hulls, this.x[i], this.y[i], left, this.order) >= 0) return true;
    return this.pool.prune(
      i,
      this.openParts(list),
      this.x[i],
      this.y[i],
      left,
      this.nodes === this.firstNode,
    );
  }

  /**
   * Which parts a node at level i may still use: 3i: all from i on; 3i+1: the kinds are used up, so part i (which is in) and
   * later ones with a minimum; 3i+2: the same without part i.
   */
  private listOf(i: number): number {
    if (this.kinds[i] < this.prepared.maxKinds) return 3 * i;
    return this.counts[i] > 0 || this.prepared.parts[i].min > 0 ? 3 * i + 1 : 3 * i + 2;
  }

  private openParts(list: number): Int32Array {
    const known = this.lists[list];
    if (known) return known;
    const i = Math.floor(list / 3);
    const variant = list % 3;
    const isOpen = (k: number): boolean =>
      variant === 0 ? k >= i : (k === i && variant === 1) || (k > i && this.prepared.parts[k].min > 0);
    const made = Int32Array.from(this.counts.keys()).filter(isOpen);
    this.lists[list] = made;
    return made;
  }

  private hullsOf(list: number): HullTable {
    const known = this.hulls[list];
    if (known) return known;
    const parts = this.openParts(list);
    const made = buildHulls(this.rows, this.weights, parts);
    this.built += parts.length * this.rows.size;
    this.hulls[list] = made;
    return made;
  }
}
