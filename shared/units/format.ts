import { PREFIXES } from './prefix';
import type { UnitSymbol } from './quantity';

/** The minus of typeset numbers. */
export const MINUS = '\u2212';
/** Between number and unit: a space that does not break. */
const NBSP = '\u00a0';

export interface FormatOptions {
  /** Significant digits, default 3. */
  digits?: number;
  /** Drop zeros after the point (`10 kHz` instead of `10.0 kHz`). */
  trim?: boolean;
}

/** Splits a finite value into a rounded mantissa text in [1, 1000) and its prefix. */
export function engineering(
  value: number,
  options: FormatOptions = {},
): { mantissa: string; exponent: number } {
  const digits = options.digits ?? 3;
  if (value === 0) return { mantissa: '0', exponent: 0 };
  // toExponential rounds in decimal, so that 999.96 becomes 1.00 k and not 1000.
  const [text, exponentText] = Math.abs(value)
    .toExponential(digits - 1)
    .split('e');
  const power = Number(exponentText);
  const low = PREFIXES[0].exponent;
  const high = PREFIXES[PREFIXES.length - 1].exponent;
  const exponent = Math.min(high, Math.max(low, Math.floor(power / 3) * 3));
  let mantissa = shiftPoint(text, power - exponent);
  if (options.trim && mantissa.includes('.')) mantissa = mantissa.replace(/0+$/, '').replace(/\.$/, '');
  return { mantissa: value < 0 ? MINUS + mantissa : mantissa, exponent };
}

/** Moves the decimal point of `d.ddd` by `places`. */
function shiftPoint(text: string, places: number): string {
  const [whole, fraction = ''] = text.split('.');
  if (places < 0) return `0.${'0'.repeat(-places - 1)}${whole}${fraction}`;
  const digits = (whole + fraction).padEnd(1 + places, '0');
  const head = digits.slice(0, 1 + places);
  const tail = digits.slice(1 + places);
  return tail === '' ? head : `${head}.${tail}`;
}

const prefixSymbol = (exponent: number) => PREFIXES.find((p) => p.exponent === exponent)?.symbol ?? '';

/** `0.0117, 'Ω'` → `11.7 mΩ`; −, no-break space, `∞` and `—` for what is not a number. */
export function formatQuantity(
  value: number | null | undefined,
  unit: UnitSymbol,
  options: FormatOptions = {},
): string {
  if (value === null || value === undefined || Number.isNaN(value)) return '—';
  if (!Number.isFinite(value)) return value < 0 ? `${MINUS}∞` : '∞';
  if (unit === '' || unit === '%' || unit === 'dB' || unit === 'mm' || unit === 'mm²')
    return formatPlain(value, unit, options);
  const { mantissa, exponent } = engineering(value, options);
  return `${mantissa}${NBSP}${prefixSymbol(exponent)}${unit}`;
}

function formatPlain(value: number, unit: UnitSymbol, options: FormatOptions): string {
  let text = Number(Math.abs(value).toPrecision(options.digits ?? 3)).toString();
  if (!options.trim && !text.includes('e')) {
    const digits = options.digits ?? 3;
    const whole = text.split('.')[0].replace(/^0$/, '').length;
    text = Number(text).toFixed(Math.max(0, digits - Math.max(whole, 1)));
  }
  const signed = value < 0 && Number(text) !== 0 ? MINUS + text : text;
  return unit === '' ? signed : `${signed}${NBSP}${unit}`;
}

/** A rail voltage as engineers write it: `0.85 V`, `3.3 V`, `48 V`; millivolts only below a tenth of a volt. */
export function formatVolts(value: number): string {
  const plain = Math.abs(value) >= 0.1 && Math.abs(value) < 1;
  return plain
    ? `${formatPlain(value, '', { trim: true, digits: 4 })}${NBSP}V`
    : formatQuantity(value, 'V', { trim: true, digits: 4 });
}

/** A number with a fixed number of decimals and the typeset minus; never `−0.0`. */
export function formatFixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? MINUS + text : text;
}

/** Headroom in dB with its sign, one decimal: `+2.4 dB`, `−2.7 dB`. */
export function formatDecibel(value: number | null | undefined, decimals = 1): string {
  if (value === null || value === undefined || Number.isNaN(value)) return '—';
  const text = formatFixed(value, decimals);
  return `${value > 0 && Number(text) !== 0 ? '+' : ''}${text}${NBSP}dB`;
}

/**
 * What a person would type to get exactly this value back: `4.7u`, `12m`, `0.85`. The mantissa is the shortest decimal
 * that reads as the same double.
 */
export function formatInput(value: number): string {
  if (value === 0) return '0';
  const [text, exponentText] = Math.abs(value).toExponential().split('e');
  const power = Number(exponentText);
  const low = PREFIXES[0].exponent;
  const high = PREFIXES[PREFIXES.length - 1].exponent;
  if (power < low || power > high + 2) return String(value);
  const exponent = Math.floor(power / 3) * 3;
  const mantissa = shiftPoint(text, power - exponent);
  const symbol = prefixSymbol(exponent).replace('µ', 'u');
  return `${value < 0 ? '-' : ''}${mantissa}${symbol}`;
}

/** IEC 60062 letter code: `4.7e-6` → `4u7`, `4.7` → `4R7` (`4F7` for farads), `0.047` → `47m`. Reads back exactly. */
export function formatLetterCode(value: number, unit: 'Ω' | 'F' | 'H'): string {
  const text = formatInput(Math.abs(value));
  const match = /^(\d+)(?:\.(\d+))?([fpnumkMGT]?)$/.exec(text);
  if (!match) return formatInput(value);
  const [, whole, fraction = '', prefix] = match;
  const letter = prefix || (unit === 'F' ? 'F' : 'R');
  return `${value < 0 ? '-' : ''}${whole}${letter}${fraction}`;
}

/** Millimetres from metres, up to 3 decimals, zeros dropped: `0.0125` → `12.5 mm`. */
export function formatLength(metres: number | null | undefined): string {
  if (metres === null || metres === undefined) return '—';
  return `${Number((metres * 1000).toFixed(3))}${NBSP}mm`;
}
