import type { Prepared } from './prepare';
import type { Rows } from './rows';

/** A mix in the making: counts (minima included) with their sum over the rows, weight and kinds kept up to date. */
export class Bank {
  readonly counts: Int32Array;
  readonly x: Float64Array;
  readonly y: Float64Array;
  weight: number;
  kinds: number;
  /** When set, only these parts may be added, and the number of kinds is the caller's business. */
  allowed: ReadonlySet<number> | null = null;
  private readonly prepared: Prepared;
  private readonly rows: Rows;

  constructor(prepared: Prepared, rows: Rows, counts?: ArrayLike<number>) {
    this.prepared = prepared;
    this.rows = rows;
    this.counts = Int32Array.from(prepared.parts, (part) => part.min);
    this.x = rows.y0x.slice();
    this.y = rows.y0y.slice();
    this.weight = prepared.baseWeight;
    this.kinds = prepared.baseKinds;
    if (counts) for (let k = 0; k < counts.length; k++) this.change(k, counts[k] - this.counts[k]);
  }

  /** True when one more of part k keeps within its maximum and the number of kinds. */
  canAdd(k: number): boolean {
    if (this.counts[k] >= this.prepared.parts[k].max) return false;
    if (this.allowed) return this.allowed.has(k);
    return this.counts[k] > 0 || this.kinds < this.prepared.maxKinds;
  }

  /** Parts with a count above zero. */
  used(): number[] {
    return Array.from(this.counts.keys()).filter((k) => this.counts[k] > 0);
  }

  clear(k: number): void {
    this.change(k, this.prepared.parts[k].min - this.counts[k]);
  }

  canRemove(k: number): boolean {
    return this.counts[k] > this.prepared.parts[k].min;
  }

  change(k: number, by: number): void {
    if (by === 0) return;
    const before = this.counts[k];
    this.counts[k] = before + by;
    if (before === 0) this.kinds++;
    else if (before + by === 0) this.kinds--;
    this.weight += by * this.prepared.parts[k].weight;
    const px = this.rows.yx[k];
    const py = this.rows.yy[k];
    for (let f = 0; f < this.x.length; f++) {
      this.x[f] += by * px[f];
      this.y[f] += by * py[f];
    }
  }
}
