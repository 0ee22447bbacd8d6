/** A function sampled over rising u with its exact value and slope, and the same function anywhere between. */
export interface Sampled {
  u: ArrayLike<number>;
  value: ArrayLike<number>;
  slope: ArrayLike<number>;
  /** Value and slope at any u in between. */
  at: (u: number) => { value: number; slope: number };
}

export interface Maximum {
  u: number;
  value: number;
  /** The first or last sample, where the function falls off into the interval. */
  edge: 'low' | 'high' | null;
}

/** Below this rise over the neighbouring valley (nepers) a bump is rounding noise on a plateau, not a peak. */
const PROMINENCE = 1e-9;

/**
 * All local maxima, both edges included where the function falls away from them. Between two samples a maximum lies
 * where the slope goes from + to −; it is found by halving on the slope, so its place is good to about 1e-13 in u
 * and its value to rounding. A flat top counts once; a falling plateau does not count. Values may be −Infinity nowhere.
 */
export function localMaxima(samples: Sampled): Maximum[] {
  const n = samples.u.length;
  const found: Maximum[] = [];
  if (n === 0) return found;
  if (n === 1) return [{ u: samples.u[0], value: samples.value[0], edge: 'low' }];
  if (samples.slope[0] <= 0) found.push({ u: samples.u[0], value: samples.value[0], edge: 'low' });
  for (let i = 0; i + 1 < n; i++) {
    const a = samples.slope[i];
    const b = samples.slope[i + 1];
    if (a > 0 && b <= 0) found.push(refineMaximum(samples, i));
    // A kink (a table's or a mask's corner): the slope jumps at the sample itself.
    // Where the slope before was rising, the turn between has been found already; a second find right beside it would leave
    // no valley between the two, and both would be dropped.
    else if (a <= 0 && b <= 0 && i > 0 && samples.slope[i - 1] <= 0 && isKink(samples, i)) {
      found.push({ u: samples.u[i], value: samples.value[i], edge: null });
    }
  }
  if (samples.slope[n - 1] > 0)
    found.push({ u: samples.u[n - 1], value: samples.value[n - 1], edge: 'high' });
  return keepProminent(samples, found);
}

/** The sample stands above both neighbours though no slope told so (one-sided slopes at a corner). */
function isKink(s: Sampled, i: number): boolean {
  return s.value[i] > s.value[i - 1] && s.value[i] > s.value[i + 1];
}

const MOST_STEPS = 120;

/**
 * Where the slope goes from + to − between two samples: false position with halved weights (Illinois), and every third step a plain
 * halving, so that a kink cannot hold it up. About ten steps to rounding on a smooth curve.
 */
export function refineMaximum(samples: Sampled, index: number): Maximum {
  let a = samples.u[index];
  let b = samples.u[index + 1];
  let fa = samples.slope[index];
  let fb = samples.slope[index + 1];
  let value = Number.NEGATIVE_INFINITY;
  let last = Number.NaN;
  let side = 0;
  for (let k = 0; k < MOST_STEPS; k++) {
    const tiny = 1e-14 * Math.max(1, Math.abs(a));
    if (b - a <= tiny) break;
    let u = k % 3 === 2 ? 0.5 * (a + b) : (a * fb - b * fa) / (fb - fa);
    if (!(u > a && u < b)) u = 0.5 * (a + b);
    const here = samples.at(u);
    value = Math.max(value, here.value);
    if (here.slope > 0) {
      a = u;
      fa = here.slope;
      if (side === 1) fb *= 0.5;
      side = 1;
    } else {
      b = u;
      fb = here.slope;
      if (side === -1) fa *= 0.5;
      side = -1;
    }
    const settled = here.slope === 0 || Math.abs(u - last) <= tiny;
    last = u;
    if (settled) break;
  }
  // The place is the slope's zero; the top is flat to rounding there, so its value is the highest seen on the way.
  const u = Number.isNaN(last) ? 0.5 * (a + b) : last;
  return { u, value: Math.max(value, samples.at(u).value), edge: null };
}

/**
 * A peak must rise above the lowest sample between it and its neighbours on both sides (edges: on one). Of two peaks with no
 * valley between them only the lower one goes, never both.
 */
function keepProminent(samples: Sampled, found: readonly Maximum[]): Maximum[] {
  const kept = [...found];
  for (let k = 0; k < kept.length; ) {
    const peak = kept[k];
    const before = kept[k - 1];
    const after = kept[k + 1];
    const left = valley(samples, before?.u ?? Number.NEGATIVE_INFINITY, peak.u);
    const right = valley(samples, peak.u, after?.u ?? Number.POSITIVE_INFINITY);
    const isLow = peak.edge !== 'low' && !(peak.value - left > PROMINENCE);
    const isFlat = peak.edge !== 'high' && !(peak.value - right > PROMINENCE);
    if (isFlat && after && after.value <= peak.value) kept.splice(k + 1, 1);
    else if (isLow && before && before.value < peak.value) kept.splice(--k, 1);
    else if (isLow || isFlat) {
      kept.splice(k, 1);
      k = Math.max(0, k - 1);
    } else k++;
  }
  return kept;
}

function valley(samples: Sampled, from: number, to: number): number {
  let low = Number.POSITIVE_INFINITY;
  let i = lowerBound(samples.u, from);
  for (; i < samples.u.length && samples.u[i] <= to; i++) low = Math.min(low, samples.value[i]);
  return low;
}

function lowerBound(u: ArrayLike<number>, value: number): number {
  let lo = 0;
  let hi = u.length;
  while (lo < hi) {
    const mid = (lo + hi) >> 1;
    if (u[mid] < value) lo = mid + 1;
    else hi = mid;
  }
  return lo;
}
