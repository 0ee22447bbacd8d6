/**
 * A linear programme that grows by columns: maximise Σ x_j subject to Σ_j (φ_j[c] + SHIFT)·x_j ≤ 1 for every corner c, x ≥ 0,
 * where φ_j[c] is what condition j ("a linear function of the mix that must not be negative") is worth at corner c.
 *
 * **Certificate.** Any feasible x with Σ x_j > 1/SHIFT has Σ_j x_j·φ_j[c] ≤ 1 − SHIFT·Σ x_j < 0 at every corner. Conditions are
 * linear (or bounded above by their interpolation) over the simplex of corners, so the sum is negative for every mix in it,
 * though each term would have to be ≥ 0: no mix meets all conditions. `solve` says 'cut' only after adding up that sum anew
 * from the columns themselves, so that a drifted inverse can cost time but never a solution.
 *
 * Revised simplex with an explicit inverse: one constraint a corner (≈ 17), so a pivot costs a few µs. A child node of the
 * sector tree only adds columns, which keeps the parent's basis feasible: it starts where the parent ended.
 */
export class Programme {
  /** Number of columns in use. */
  size = 0;
  /** Total pivots; the measure of work. */
  pivots = 0;
  readonly corners: number;
  /** Dual prices of the corners; divided by their sum, the mix (as weights of the corners) that fares best. */
  readonly price: Float64Array;
  private phi: Float64Array;
  private slack: Float64Array;
  private readonly basis: Int32Array;
  private readonly inverse: Float64Array;
  private readonly value: Float64Array;
  private readonly column: Float64Array;
  /** Σ x_j at present: above 1/SHIFT nothing meets all conditions; the nearer, the tighter. */
  total = 0;

  constructor(corners: number) {
    this.corners = corners;
    this.phi = new Float64Array(corners * 512);
    this.slack = new Float64Array(512);
    this.price = new Float64Array(corners);
    this.basis = new Int32Array(corners);
    this.inverse = new Float64Array(corners * corners);
    this.value = new Float64Array(corners);
    this.column = new Float64Array(corners);
    this.reset();
  }

  /** Forgets columns and basis. */
  reset(): void {
    this.size = 0;
    this.clearBasis();
  }

  /**
   * Adds a condition by its worth at every corner, scaled (which changes nothing in its meaning) so that none is below −1.
   * `slack`: how far below zero the worth may be by rounding alone.
   */
  add(worth: Float64Array, slack: number): void {
    const m = this.corners;
    if ((this.size + 1) * m > this.phi.length) this.grow();
    let low = 1;
    for (let c = 0; c < m; c++) if (-worth[c] > low) low = -worth[c];
    const at = this.size * m;
    for (let c = 0; c < m; c++) this.phi[at + c] = worth[c] / low;
    this.slack[this.size] = slack / low;
    this.size++;
  }

  /** Drops the columns from `size` on. The caller restores a basis that does not use them. */
  truncate(size: number): void {
    this.size = size;
  }

  /** Copies the basis, its inverse and prices to (or from) `store`, which needs `stateSize` numbers. */
  save(store: Float64Array): void {
    const m = this.corners;
    store.set(this.inverse);
    store.set(this.value, m * m);
    store.set(this.price, m * m + m);
    for (let i = 0; i < m; i++) store[m * m + 2 * m + i] = this.basis[i];
    store[m * m + 3 * m] = this.total;
  }

  load(store: Float64Array): void {
    const m = this.corners;
    for (let i = 0; i < m * m; i++) this.inverse[i] = store[i];
    for (let i = 0; i < m; i++) {
      this.value[i] = store[m * m + i];
      this.price[i] = store[m * m + m + i];
      this.basis[i] = store[m * m + 2 * m + i];
    }
    this.total = store[m * m + 3 * m];
  }

  get stateSize(): number {
    return this.corners * (this.corners + 3) + 1;
  }

  /** 'cut': no mix meets all conditions. 'open': the best x is found (or `limit` pivots made) and proves nothing. */
  solve(limit = 200): 'cut' | 'open' {
    for (let k = 0; k < limit; k++) {
      if (this.total * SHIFT > 1 + 1e-9 && this.isCertified()) return 'cut';
      if (!this.pivot()) break;
    }
    return this.total * SHIFT > 1 + 1e-9 && this.isCertified() ? 'cut' : 'open';
  }

  private clearBasis(): void {
    const m = this.corners;
    this.inverse.fill(0);
    for (let i = 0; i < m; i++) {
      this.inverse[i * m + i] = 1;
      this.basis[i] = -1;
      this.value[i] = 1;
      this.price[i] = 0;
    }
    this.total = 0;
  }

  private isCertified(): boolean {
    const m = this.corners;
    const { phi, basis, value, slack } = this;
    for (let c = 0; c < m; c++) {
      let sum = 0;
      let allowance = 0;
      for (let i = 0; i < m; i++) {
        const j = basis[i];
        const x = value[i];
        if (j < 0 || !(x > 0)) continue;
        sum += x * phi[j * m + c];
        allowance += x * (slack[j] + 1e-10);
      }
      if (!(sum < -allowance)) return false;
    }
    return true;
  }

  private pivot(): boolean {
    const m = this.corners;
    const { phi, price, inverse, value, basis, column } = this;
    let priceSum = 0;
    for (let c = 0; c < m; c++) priceSum += price[c];
    const base = 1 - SHIFT * priceSum;
    let enter = -1;
    let gain = 1e-9;
    for (let j = 0, at = 0; j < this.size; j++, at += m) {
      let d = base;
      for (let c = 0; c < m; c++) d -= price[c] * phi[at + c];
      if (d > gain) {
        gain = d;
        enter = j;
      }
    }
    // slack of corner c, numbered −2 − c
    for (let c = 0; c < m; c++)
      if (-price[c] > gain) {
        gain = -price[c];
        enter = -2 - c;
      }
    if (enter === -1) return false;
    let leave = -1;
    let ratio = Number.POSITIVE_INFINITY;
    for (let i = 0; i < m; i++) {
      let a = 0;
      if (enter < 0) a = inverse[i * m - 2 - enter];
      else for (let c = 0; c < m; c++) a += inverse[i * m + c] * (phi[enter * m + c] + SHIFT);
      column[i] = a;
      if (a > 1e-9 && value[i] < ratio * a) {
        ratio = value[i] / a;
        leave = i;
      }
    }
    if (leave < 0) return false;
    this.pivots++;
    const scale = 1 / column[leave];
    const row = leave * m;
    for (let c = 0; c < m; c++) {
      inverse[row + c] *= scale;
      price[c] += gain * inverse[row + c];
    }
    for (let i = 0; i < m; i++) {
      if (i === leave) continue;
      const factor = column[i];
      const to = i * m;
      for (let c = 0; c < m; c++) inverse[to + c] -= factor * inverse[row + c];
      value[i] = Math.max(0, value[i] - factor * ratio);
    }
    value[leave] = ratio;
    basis[leave] = Math.max(enter, -1);
    this.total += gain * ratio;
    return true;
  }

  private grow(): void {
    const phi = new Float64Array(2 * this.phi.length);
    phi.set(this.phi);
    this.phi = phi;
    const slack = new Float64Array(2 * this.slack.length);
    slack.set(this.slack);
    this.slack = slack;
  }
}

/** Above the largest deficit (1), so that every coefficient is above zero and the programme is bounded. */
export const SHIFT = 1.001;
