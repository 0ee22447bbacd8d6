import { readClass1 } from './dielectric-class-1';
import { readEiaClass2, readIecClass2 } from './dielectric-class-2';

interface CodeRange {
  code: string;
  /** Temperatures that the code speaks of, °C. */
  low_C: number;
  high_C: number;
  /** Where the change is zero by definition, °C. */
  reference_C: number;
}

/** Class 1: a straight line over temperature. */
export interface DielectricSlope extends CodeRange {
  class: 1;
  slope_ppmPerK: number;
  /** ±. */
  tolerance_ppmPerK: number;
}

/**
 * Class 2 and 3: limits between which the change lies. 3 stands for the high-permittivity kinds (EIA letters U and V, IEC 2E and
 * 2F), which lose far more with voltage and time; IEC counts them among class 2.
 */
export interface DielectricLimits extends CodeRange {
  class: 2 | 3;
  /** Largest loss and gain as fractions, e.g. −0.15 and 0.15. */
  lowest: number;
  highest: number;
}

export type Dielectric = DielectricSlope | DielectricLimits;

/** As often typed: with the letter O for the digit, or by the older name. */
const ALIASES: Readonly<Record<string, string>> = { COG: 'C0G', NP0: 'C0G', NPO: 'C0G', COH: 'C0H' };

/**
 * What a ceramic's dielectric code says, or null for what is no such code; upper or lower case, spaces around it ignored.
 * EIA-198 class 1 (`C0G`, `U2J`) and class 2 (`X7R`, `Y5V`) by their tables, IEC 60384-9/-22 class 2 short codes (`2R1`).
 */
export function readDielectric(code: string): Dielectric | null {
  const typed = code.trim().toUpperCase();
  const known = ALIASES[typed] ?? typed;
  return readEiaClass2(known) ?? readClass1(known) ?? readIecClass2(known);
}
