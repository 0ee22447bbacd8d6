import type { UnitSymbol } from '@shared/units/quantity';

interface Trap {
  found: RegExp;
  wanted: string;
  /** The column whose numbers it is about: where they carry their own unit or prefix, the header misleads nobody. */
  column?: number;
}

/** A unit of a column stands free, in brackets or behind a sign: `f [MHz]`, `freq_kHz`; behind a number it is a remark: `up to 3 GHz`. */
const unit = (text: string, flags = 'u'): RegExp =>
  new RegExp(`(?<![\\p{L}\\p{N}]|\\p{N}\\s)(${text})(?![\\p{L}\\p{N}])`, flags);

const FREQUENCY: Trap = {
  found: unit('[kmgt]hz|rad/s', 'iu'),
  wanted: 'give frequencies in Hz, or write the unit with each number',
  column: 0,
};
const IMPEDANCE: Trap = {
  found: unit('[mµμukKMG]\\s?(?:[Ω\\u2126]|[Oo]hms?|OHMS?)|[Mm]illi-?\\s?[Oo]hms?|[Kk]ilo-?\\s?[Oo]hms?'),
  wanted: 'give impedances in ohm, or write the unit with each number',
  column: 1,
};
const LEVEL: Trap = {
  found: unit('dB(?:m|Ω|\\u2126|-?ohm)?|decibels?', 'iu'),
  wanted: 'give impedances in ohm',
};
const POLAR: Trap = {
  found: unit(
    '\\|\\s*\\p{L}?\\s*\\||∠|°(?!\\s*C)|magnitude|mag|abs|phase(?!\\s*(?:margin|\\p{N}))|phi|arg|theta|degrees?|deg(?!\\s*C)|angle',
    'iu',
  ),
  wanted: 'give Re Z and Im Z in ohm, not magnitude and phase',
};

/** As it begins files of network parameters: `# MHZ S RI R 50`. */
const OPTION_LINE = /^[#!]?\s*(?:[kMGT]?Hz\s+)?[SYZGH]\s+(?:RI|MA|DB)\b/i;

const isBare = (cell: string | undefined): boolean => cell !== undefined && !/[^\d\s.,eE+\u2212-]/.test(cell);
const quoted = (line: string): string => `“${line.length > 48 ? `${line.slice(0, 48)}…` : line}”`;

/**
 * Why a line that holds no point forbids reading the points as they stand: it names other units, or another form of the numbers,
 * than a table over frequency takes. `cells` are the numbers of the first point. null: nothing in it says so.
 */
export function headerFault(
  line: string,
  units: readonly UnitSymbol[],
  cells: readonly string[],
): string | null {
  if (units[0] !== 'Hz') return null;
  const text = line.replace(/["']/g, '').trim();
  if (OPTION_LINE.test(text))
    return `the header ${quoted(text)} begins network parameters: give frequency in Hz, Re Z and Im Z in ohm`;
  const traps = units.length > 2 ? [FREQUENCY, IMPEDANCE, LEVEL, POLAR] : [FREQUENCY, IMPEDANCE, LEVEL];
  for (const { found, wanted, column } of traps) {
    const word = found.exec(text.replaceAll('_', ' '))?.[1];
    if (word === undefined || (column !== undefined && !isBare(cells[column]))) continue;
    return `the header ${quoted(text.replace(/^#\s*/, ''))} says ${word.trim()}: ${wanted}`;
  }
  return null;
}
