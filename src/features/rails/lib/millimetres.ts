import { parseLength } from '@shared/units/parse';

/** What stands in a field of millimetres for a length, so that reading it gives the very same double back. */
export function millimetres(metres: number): string {
  const [digits, exponent] = metres.toExponential().split('e');
  const exact = `${digits}e${Number(exponent) + 3}`;
  const plain = String(Number(exact));
  const back = parseLength(plain);
  return back.ok && back.value === metres ? plain : exact;
}
