/** A unit is believed in when every weight is a whole number of units within this relative error. */
const TOLERANCE = 1e-9;
/** Beyond so many units in the heaviest part a step of one unit is no help to the proof. */
const MOST_UNITS = 1e6;

/**
 * The largest unit of which all weights are whole multiples (step 1), by Euclid's algorithm on reals; prices such as
 * 0.025 and 0.3 give 0.025. Two different weights then differ by one unit or more, so "lighter than W" means "at most
 * W − 1 unit" and the arithmetic on budgets is exact. Where no such unit exists the heaviest weight is the unit and step is 0.
 */
export function weightUnit(weights: readonly number[]): { unit: number; step: 0 | 1 } {
  const largest = weights.reduce((a, b) => Math.max(a, b), 0);
  let unit = weights[0];
  for (const weight of weights) unit = realGcd(unit, weight, largest * TOLERANCE);
  const whole = weights.every(
    (w) => Math.abs(w / unit - Math.round(w / unit)) <= (TOLERANCE * largest) / unit,
  );
  if (unit > 0 && largest / unit <= MOST_UNITS && whole) return { unit, step: 1 };
  return { unit: largest, step: 0 };
}

function realGcd(a: number, b: number, tolerance: number): number {
  let [x, y] = a > b ? [a, b] : [b, a];
  while (y > tolerance) {
    const rest = x - y * Math.round(x / y);
    [x, y] = [y, Math.abs(rest)];
  }
  return x;
}
