const NBSP = '\u00a0';

export interface DecimalRoom {
  /** Characters from the decimal point on, the point included. */
  fraction: number;
  /** Characters of the unit with its prefix. */
  unit: number;
}

/**
 * Pads `4.7 µF` to the right so that, in a column of equal digits set flush right, the decimal points stand under each
 * other: the fraction to `room.fraction` characters, the unit to `room.unit`. What has no digits is left alone.
 */
export function alignDecimal(text: string, room: DecimalRoom): string {
  const [number, ...rest] = text.split(NBSP);
  if (!/\d/.test(number)) return text;
  const point = number.indexOf('.');
  const whole = point < 0 ? number : number.slice(0, point);
  const fraction = (point < 0 ? '' : number.slice(point)).padEnd(room.fraction, NBSP);
  const unit = rest.join(NBSP).padEnd(room.unit, NBSP);
  return room.unit > 0 ? `${whole}${fraction}${NBSP}${unit}` : whole + fraction;
}

/** Characters that the longest fraction of a column needs, its point included; 0 where there is none. */
export function fractionRoom(texts: readonly string[]): number {
  return Math.max(0, ...texts.map((text) => /\.\d+/.exec(text)?.[0].length ?? 0));
}
