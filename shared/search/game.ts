/**
 * The best weights for a surrogate test: given a matrix φ (corners × rows, row-major by corner), find λ ≥ 0 that makes
 * max over corners of Σ_f λ_f·φ[c][f] as small as it can be against Σ λ = 1. This is a matrix game; with all entries
 * shifted above zero it is the linear programme  max Σ x_f  subject to  Σ_f P[c][f]·x_f ≤ 1 for every corner, x ≥ 0,
 * which starts feasible at x = 0 and has one constraint a corner: a dense primal simplex with ~17 rows, largest
 * coefficient first. Any x on the way is a valid λ, so a limit on the pivots costs sharpness, never rigour.
 */
export class Game {
  private tableau = new Float64Array(0);
  private basis = new Int32Array(0);
  readonly lambda: Float64Array;
  private readonly rows: number;

  constructor(rows: number) {
    this.rows = rows;
    this.lambda = new Float64Array(rows);
  }

  /** Solves for `corners` lines of `phi` (each `rows` long); λ is left in `lambda`. Returns the pivots made. */
  solve(phi: Float64Array, corners: number, maxPivots = 60): number {
    const n = this.rows;
    const width = n + corners + 1;
    if (this.tableau.length < width * (corners + 1)) this.tableau = new Float64Array(width * (corners + 1));
    if (this.basis.length < corners) this.basis = new Int32Array(corners);
    const { tableau: t, basis } = this;
    let low = 0;
    for (let i = 0; i < corners * n; i++) if (phi[i] < low) low = phi[i];
    const shift = 1e-3 - low;
    t.fill(0, 0, width * (corners + 1));
    for (let c = 0; c < corners; c++) {
      const at = c * width;
      for (let f = 0; f < n; f++) t[at + f] = Math.min(phi[c * n + f] + shift, CAP);
      t[at + n + c] = 1;
      t[at + width - 1] = 1;
      basis[c] = n + c;
    }
    const objective = corners * width;
    for (let f = 0; f < n; f++) t[objective + f] = -1;
    let pivots = 0;
    while (pivots < maxPivots && this.pivot(width, corners)) pivots++;
    this.lambda.fill(0);
    let total = 0;
    for (let c = 0; c < corners; c++) {
      const value = t[c * width + width - 1];
      if (basis[c] < n && value > 0) {
        this.lambda[basis[c]] = value;
        total += value;
      }
    }
    if (total > 0) for (let f = 0; f < n; f++) this.lambda[f] /= total;
    return pivots;
  }

  private pivot(width: number, corners: number): boolean {
    const { tableau: t, basis } = this;
    const objective = corners * width;
    let enter = -1;
    let most = -1e-9;
    for (let j = 0; j < width - 1; j++)
      if (t[objective + j] < most) {
        most = t[objective + j];
        enter = j;
      }
    if (enter < 0) return false;
    let leave = -1;
    let ratio = Number.POSITIVE_INFINITY;
    for (let c = 0; c < corners; c++) {
      const value = t[c * width + enter];
      if (value <= 1e-11) continue;
      const r = t[c * width + width - 1] / value;
      if (r < ratio) {
        ratio = r;
        leave = c;
      }
    }
    if (leave < 0) return false;
    basis[leave] = enter;
    const at = leave * width;
    const inverse = 1 / t[at + enter];
    for (let j = 0; j < width; j++) t[at + j] *= inverse;
    for (let c = 0; c <= corners; c++) {
      if (c === leave) continue;
      const factor = t[c * width + enter];
      if (factor === 0) continue;
      const to = c * width;
      for (let j = 0; j < width; j++) t[to + j] -= factor * t[at + j];
    }
    return true;
  }
}

/** Entries above this are cut: a corner so far outside is won whatever the exact figure, and the tableau stays well scaled. */
const CAP = 1e3;
