/** The search ends when a step is below this share of the interval: what is flat there is then exact to 1e-18. */
const EXACT = 1e-9;
const MOST_ROUNDS = 60;

/**
 * The zero of a function between `low` and `high`, where it changes sign, by Newton's method from `guess`, halving where
 * that would leave the interval. `at` gives value and derivative; `fromAbove`: it is positive at `low`.
 */
export function zeroBetween(
  at: (x: number) => readonly [value: number, slope: number],
  low: number,
  high: number,
  guess: number,
  fromAbove: boolean,
): number {
  let left = low;
  let right = high;
  let x = guess;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const [value, slope] = at(x);
    if (value > 0 === fromAbove) left = x;
    else right = x;
    let next = x - value / slope;
    if (!(next > left && next < right)) next = 0.5 * (left + right);
    const moved = Math.abs(next - x);
    x = next;
    if (moved <= EXACT * (high - low)) break;
  }
  return x;
}

/** Where, between 0 and 1, the cubic with the values a, b and the slopes at both ends turns; 0.5 where it does not. */
export function cubicTurn(a: number, b: number, slopeA: number, slopeB: number): number {
  const c2 = 3 * (b - a) - 2 * slopeA - slopeB;
  const c3 = 2 * (a - b) + slopeA + slopeB;
  const square = c2 * c2 - 3 * c3 * slopeA;
  if (!(square >= 0)) return 0.5;
  // Both roots of 3·c3·x² + 2·c2·x + slopeA without cancellation.
  const far = -(c2 + Math.sign(c2 || 1) * Math.sqrt(square));
  return [far / (3 * c3), slopeA / far].find((x) => x > 0 && x < 1) ?? 0.5;
}
