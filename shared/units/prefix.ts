/** SI prefixes in steps of a thousand, by exponent of ten. µ is U+00B5; U+03BC and `u` are read as the same. */
export const PREFIXES: readonly { symbol: string; exponent: number }[] = [
  { symbol: 'f', exponent: -15 },
  { symbol: 'p', exponent: -12 },
  { symbol: 'n', exponent: -9 },
  { symbol: 'µ', exponent: -6 },
  { symbol: 'm', exponent: -3 },
  { symbol: '', exponent: 0 },
  { symbol: 'k', exponent: 3 },
  { symbol: 'M', exponent: 6 },
  { symbol: 'G', exponent: 9 },
  { symbol: 'T', exponent: 12 },
];

const READ: Readonly<Record<string, number>> = {
  f: -15,
  p: -12,
  n: -9,
  u: -6,
  µ: -6,
  μ: -6,
  m: -3,
  k: 3,
  K: 3,
  M: 6,
  G: 9,
  T: 12,
};

/** Exponent of a prefix as typed, or null when it is none. `K` is read as kilo, as IEC 60062 writes it. */
export function prefixExponent(symbol: string): number | null {
  return READ[symbol] ?? null;
}

/**
 * `digits` × 10^`exponent` without the rounding of a multiplication: the decimal text is handed to the number parser,
 * so that 4.7 µ is the double nearest to 4.7e-6.
 */
export function scaleDecimal(digits: string, exponent: number): number {
  return Number(`${digits}e${exponent}`);
}
