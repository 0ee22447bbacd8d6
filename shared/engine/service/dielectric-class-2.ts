import type { DielectricLimits } from './dielectric';

type Limits = readonly [lowest_percent: number, highest_percent: number];
type Table<T> = Readonly<Record<string, T>>;

/** EIA-198: lowest temperature, highest temperature, change from the 25 °C value. */
const EIA_LOW_C: Table<number> = { X: -55, Y: -30, Z: 10 };
const EIA_HIGH_C: Table<number> = { 2: 45, 4: 65, 5: 85, 6: 105, 7: 125, 8: 150, 9: 200 };
const EIA_CHANGE: Table<Limits> = {
  A: [-1, 1],
  B: [-1.5, 1.5],
  C: [-2.2, 2.2],
  D: [-3.3, 3.3],
  E: [-4.7, 4.7],
  F: [-7.5, 7.5],
  P: [-10, 10],
  R: [-15, 15],
  S: [-22, 22],
  T: [-33, 22],
  U: [-56, 22],
  V: [-82, 22],
};

/** IEC 60384-9/-22, from memory (no readable copy was found): change from the 20 °C value without voltage; range by the last digit. */
const IEC_CHANGE: Table<Limits> = {
  B: [-10, 10],
  C: [-20, 20],
  D: [-30, 20],
  E: [-56, 22],
  F: [-80, 30],
  R: [-15, 15],
  X: [-15, 15],
};
const IEC_RANGE_C: Table<readonly [number, number]> = {
  1: [-55, 125],
  2: [-55, 85],
  3: [-40, 85],
  4: [-25, 85],
  6: [10, 85],
};

const own = <T>(table: Table<T>, key: string): T | undefined =>
  Object.hasOwn(table, key) ? table[key] : undefined;

function limits(
  code: string,
  range: readonly [number, number],
  reference_C: number,
  change: Limits,
): DielectricLimits {
  const [lowest, highest] = change;
  return {
    code,
    class: lowest <= -56 ? 3 : 2,
    low_C: range[0],
    high_C: range[1],
    reference_C,
    lowest: lowest / 100,
    highest: highest / 100,
  };
}

/** EIA-198 class 2 or 3 code (letter, digit, letter), upper case; null for anything else. */
export function readEiaClass2(code: string): DielectricLimits | null {
  if (code.length !== 3) return null;
  const low_C = own(EIA_LOW_C, code[0]);
  const high_C = own(EIA_HIGH_C, code[1]);
  const change = own(EIA_CHANGE, code[2]);
  if (low_C === undefined || high_C === undefined || change === undefined) return null;
  return limits(code, [low_C, high_C], 25, change);
}

/** IEC 60384 class 2 short code (2, letter, digit), upper case; null for anything else. */
export function readIecClass2(code: string): DielectricLimits | null {
  if (code.length !== 3 || code[0] !== '2') return null;
  const change = own(IEC_CHANGE, code[1]);
  const range = own(IEC_RANGE_C, code[2]);
  return change && range ? limits(code, range, 20, change) : null;
}
