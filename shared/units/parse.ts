import { prefixExponent, scaleDecimal } from './prefix';
import type { UnitSymbol } from './quantity';

export type Parsed = { ok: true; value: number } | { ok: false; reason: string };

const no = (reason: string): Parsed => ({ ok: false, reason });

/** What was typed, short enough to be repeated in a sentence. */
const shortened = (text: string): string => (text.length > 24 ? `${text.slice(0, 24)}…` : text);

const SPELLINGS: Readonly<Record<UnitSymbol, readonly string[]>> = {
  Ω: ['Ω', '\u2126', 'ohm', 'ohms', 'Ohm', 'R'],
  H: ['H'],
  F: ['F'],
  Hz: ['Hz', 'hz', 'HZ'],
  V: ['V'],
  A: ['A'],
  s: ['s', 'sec'],
  m: ['m'],
  mm: ['mm'],
  'mm²': ['mm²', 'mm2'],
  W: ['W'],
  J: ['J'],
  C: ['C'],
  '%': ['%'],
  dB: ['dB'],
  '': [],
};

/** Letters that stand for the decimal point without scaling: R in general, F for farads (IEC 60062), V as in `6V3` (common practice). */
const POINT_LETTERS: Partial<Record<UnitSymbol, string>> = { Ω: 'R', F: 'RF', H: 'R', V: 'V' };

/** Units that are never written with a prefix here. */
const PLAIN: ReadonlySet<UnitSymbol> = new Set(['%', 'dB', '', 'mm', 'mm²']);

/**
 * Reads what an engineer types for a quantity of `unit`, in base units: `4.7uF`, `4u7`, `4R7`, `R47`, `12m`,
 * `0.5 nH`, `1e-9`, `3 %`. A decimal comma is understood (`4,7u`) unless it could be a thousands separator (`1,500`),
 * which is refused with the question. Source of the letter codes: IEC 60062.
 */
export function parseQuantity(text: string, unit: UnitSymbol): Parsed {
  const clean = text
    .trim()
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/[\u00a0\u2009\u202f]/g, ' ');
  if (clean === '') return no('type a number');
  return parseLetterCode(clean, unit) ?? parseDecimal(clean, unit);
}

function parseLetterCode(text: string, unit: UnitSymbol): Parsed | null {
  if (PLAIN.has(unit)) return null;
  const match = /^([+-]?)(\d*)([A-Za-zµμ])(\d+)\s*([A-Za-zΩ\u2126]*)$/u.exec(text);
  if (!match) return null;
  const [, sign, whole, letter, fraction, suffix] = match;
  if (letter === 'e' || letter === 'E') return null;
  if (suffix !== '' && !SPELLINGS[unit].includes(suffix)) return null;
  const exponent = POINT_LETTERS[unit]?.includes(letter) ? 0 : prefixExponent(letter);
  if (exponent === null) return null;
  return { ok: true, value: scaleDecimal(`${sign}${whole || '0'}.${fraction}`, exponent) };
}

function parseDecimal(text: string, unit: UnitSymbol): Parsed {
  const match = /^([+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:[eE][+-]?\d+)?)\s*(.*)$/u.exec(text);
  if (!match) return no(`“${shortened(text)}” is not a number`);
  const [, number, rest] = match;
  const comma = commaQuestion(number, rest);
  if (comma) return no(comma);
  if (unit === 'Hz' && /^m\s*hz$/.test(rest.trim()))
    return no('write MHz for megahertz (m stands for milli)');
  const digits = number.replace(',', '.');
  const [mantissa, exponentText] = digits.split(/[eE]/);
  const exponent = suffixExponent(rest.trim(), unit);
  if (exponent === null)
    return no(
      unit === ''
        ? `“${shortened(rest)}” is not understood`
        : `“${shortened(rest)}” is not a unit of ${unit}`,
    );
  const value = scaleDecimal(mantissa, exponent + Number(exponentText ?? 0));
  return Number.isFinite(value) ? { ok: true, value } : no('the number is too large');
}

/** A comma that could part thousands or decimals is asked about: `1,500`; `0,125` and `4,7` can only be decimals. */
function commaQuestion(number: string, rest: string): string | null {
  if (/^[+-]?[1-9]\d{0,2},\d{3}$/.test(number) && !/^,/.test(rest))
    return `write ${number.replace(',', '.')} or ${number.replace(',', '')}: the comma could mean either`;
  if (/^(,\d{3})+/.test(rest)) return 'write the number without commas between thousands';
  return null;
}

function suffixExponent(suffix: string, unit: UnitSymbol): number | null {
  // `1R` and `1F`: the letter of the decimal point with nothing behind it.
  if (suffix === '' || SPELLINGS[unit].includes(suffix) || POINT_LETTERS[unit]?.includes(suffix)) return 0;
  if (PLAIN.has(unit)) return null;
  const exponent = prefixExponent(suffix[0]);
  if (exponent === null) return null;
  const rest = suffix.slice(1).trim();
  return rest === '' || SPELLINGS[unit].includes(rest) ? exponent : null;
}

const LENGTHS: Readonly<Record<string, number>> = {
  mm: -3,
  cm: -2,
  um: -6,
  µm: -6,
  μm: -6,
  // As copper is ordered: 35u.
  u: -6,
  µ: -6,
  μ: -6,
  m: 0,
};
/** 1 inch is 25.4 mm exactly (International yard and pound agreement, 1959). */
const INCHES: Readonly<Record<string, number>> = { in: 0.0254, '"': 0.0254, mil: 0.0000254, mils: 0.0000254 };

/** Reads a length; a bare number is in millimetres. `12`, `0.2 mm`, `100um`, `5 mil`, `1.5 in`. Gives metres. */
export function parseLength(text: string): Parsed {
  const match = /^([+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:[eE][+-]?\d+)?)\s*(\D*)$/u.exec(
    text.trim().replace(/\u2212/g, '-'),
  );
  if (!match) return no(text.trim() === '' ? 'type a length' : `“${shortened(text.trim())}” is not a length`);
  const comma = commaQuestion(match[1], match[2]);
  if (comma) return no(comma);
  const number = match[1].replace(',', '.');
  const unit = match[2].trim();
  const inch = INCHES[unit];
  if (inch !== undefined) return { ok: true, value: Number(number) * inch };
  const exponent = unit === '' ? -3 : LENGTHS[unit];
  if (exponent === undefined)
    return no(`“${shortened(unit)}” is not a unit of length: use mm, µm, mil or in`);
  const [mantissa, exponentText] = number.split(/[eE]/);
  return { ok: true, value: scaleDecimal(mantissa, exponent + Number(exponentText ?? 0)) };
}
