import type { DielectricSlope } from './dielectric';

/** Significant figure of the slope, ppm/K. */
const FIGURE = lookup('C 0, B 0.3, L 0.8, A 0.9, M 1, P 1.5, R 2.2, S 3.3, T 4.7, V 5.6, U 7.5');
/** Multiplier. Tables disagree about 4, and only one catalogue prints 5 and 9: codes with these stay unread. */
const MULTIPLIER = lookup('0 -1, 1 -10, 2 -100, 3 -1000, 6 10, 7 100, 8 1000');
/** Tolerance of the slope, ± ppm/K. */
const TOLERANCE = lookup('G 30, H 60, J 120, K 250, L 500, M 1000, N 2500');

function lookup(table: string): ReadonlyMap<string, number> {
  return new Map(
    table.split(', ').map((entry) => {
      const [sign, value] = entry.split(' ');
      return [sign, Number(value)];
    }),
  );
}

/**
 * EIA-198 class 1 code (figure, multiplier, tolerance), upper case; null for anything else. The slope is stated from 25 °C; the
 * range −55 … 125 °C is the usual one, since the code names none.
 */
export function readClass1(code: string): DielectricSlope | null {
  if (code.length !== 3) return null;
  const figure = FIGURE.get(code[0]);
  const multiplier = MULTIPLIER.get(code[1]);
  const tolerance_ppmPerK = TOLERANCE.get(code[2]);
  if (figure === undefined || multiplier === undefined || tolerance_ppmPerK === undefined) return null;
  // 7.5 × 100 and the like are exact; a figure of 0 must not become −0.
  const slope_ppmPerK = figure === 0 ? 0 : Number((figure * multiplier).toPrecision(6));
  return { code, class: 1, low_C: -55, high_C: 125, reference_C: 25, slope_ppmPerK, tolerance_ppmPerK };
}
