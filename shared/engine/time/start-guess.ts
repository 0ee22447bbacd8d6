import { type Ladder, STEP } from './ladder';

/** Logarithms of the coefficients of A and B, lowest power first; −Infinity for a coefficient of zero. */
export interface LogCoefficients {
  a: number[];
  b: number[];
}

/**
 * The coefficients of both polynomials of a ladder. They are sums of products of what is not negative, so none is lost by
 * cancellation; logarithms, since hundreds of decades lie between the first and the last.
 */
export function logCoefficients({ steps }: Ladder): LogCoefficients {
  let a = [0];
  let b: number[] = [];
  for (let k = 0; k < steps.length; k += STEP) {
    const [n, q, z] = [steps.slice(k, k + 2), steps.slice(k + 2, k + 5), steps.slice(k + 5, k + STEP)].map(
      logs,
    );
    [a, b] = [plus(times(a, q), times(b, z)), plus(times(b, q), times(a, n))];
  }
  return { a, b };
}

function logs(values: Float64Array): number[] {
  let length = values.length;
  while (length > 0 && values[length - 1] === 0) length--;
  return Array.from(values.subarray(0, length), Math.log);
}

function times(x: readonly number[], y: readonly number[]): number[] {
  if (x.length === 0 || y.length === 0) return [];
  const product = new Array<number>(x.length + y.length - 1).fill(Number.NEGATIVE_INFINITY);
  x.forEach((one, i) => {
    y.forEach((other, j) => {
      product[i + j] = logAdd(product[i + j], one + other);
    });
  });
  return product;
}

function plus(x: readonly number[], y: readonly number[]): number[] {
  const [long, short] = x.length >= y.length ? [x, y] : [y, x];
  return long.map((one, i) => (i < short.length ? logAdd(one, short[i]) : one));
}

/** ln(eˣ + eʸ) without overflow. */
function logAdd(x: number, y: number): number {
  const high = Math.max(x, y);
  return high === Number.NEGATIVE_INFINITY ? high : high + Math.log1p(Math.exp(Math.min(x, y) - high));
}

/**
 * Where to begin the search for the zeros of a polynomial, given the logarithms of its coefficients: on circles whose radii
 * are the slopes of the upper convex hull of ln|b_k| over k, as many on each as the edge is long (D. A. Bini, Numerical
 * Algorithms 13, 1996), all in the left half plane, where a passive rail has its poles.
 */
export function startGuess(logB: readonly number[]): { re: Float64Array; im: Float64Array } {
  const hull: number[] = [];
  const slope = (i: number, j: number) => (logB[j] - logB[i]) / (j - i);
  logB.forEach((value, k) => {
    if (value === Number.NEGATIVE_INFINITY) return;
    while (
      hull.length > 1 &&
      slope(hull[hull.length - 2], k) >= slope(hull[hull.length - 2], hull[hull.length - 1])
    )
      hull.pop();
    hull.push(k);
  });
  const n = Math.max(0, logB.length - 1 - (hull[0] ?? 0));
  const re = new Float64Array(n);
  const im = new Float64Array(n);
  let found = 0;
  for (let edge = 0; edge + 1 < hull.length; edge++) {
    const many = hull[edge + 1] - hull[edge];
    const radius = Math.exp(-slope(hull[edge], hull[edge + 1]));
    for (let i = 0; i < many; i++, found++) {
      // A little off what would be symmetrical: two guesses that mirror each other on the real axis could never leave it.
      const angle = Math.PI * (0.5 + (i + 0.5) / many) + 0.11 + 0.07 * Math.sin(3 * found + 1);
      re[found] = radius * Math.cos(angle);
      im[found] = radius * Math.sin(angle);
    }
  }
  return { re, im };
}
