import { EngineError } from '../errors';

type Span = readonly [low: number, high: number];

/** ± per cent at any value (IEC 60062). */
const PERCENT = new Map<string, Span>([
  ['F', [-1, 1]],
  ['G', [-2, 2]],
  ['J', [-5, 5]],
  ['K', [-10, 10]],
  ['M', [-20, 20]],
  ['Z', [-20, 80]],
]);
/** ± pF below 10 pF. From 10 pF on some tables read the same letters as per cent and others not at all, so they are refused there. */
const PICOFARAD = new Map<string, number>([
  ['B', 0.1],
  ['C', 0.25],
  ['D', 0.5],
]);
const SMALL_F = 10e-12;

/**
 * Least and greatest C ÷ marked C that a tolerance letter allows, for a capacitance in farad. Upper or lower case. Throws
 * EngineError('tolerance', …) for an unknown letter, for B, C, D from 10 pF on, and where the low end leaves no capacitance.
 */
export function toleranceFactors(letter: string, capacitance_F: number): { low: number; high: number } {
  if (!(capacitance_F > 0) || !Number.isFinite(capacitance_F))
    throw new EngineError('capacitance_F', 'must be above zero and finite');
  const key = letter.trim().toUpperCase();
  const percent = PERCENT.get(key);
  if (percent) return { low: 1 + percent[0] / 100, high: 1 + percent[1] / 100 };
  const picofarad = PICOFARAD.get(key);
  if (picofarad === undefined)
    throw new EngineError('tolerance', `${letter} is no tolerance letter: B C D F G J K M Z`);
  // 10 pF may have come as 10 × 1e-12: a hair below is not below.
  if (capacitance_F >= SMALL_F * (1 - 1e-9))
    throw new EngineError('tolerance', `${key} stands for ±${picofarad} pF, below 10 pF only`);
  const part = (picofarad * 1e-12) / capacitance_F;
  if (part >= 1)
    throw new EngineError('tolerance', `±${picofarad} pF leaves nothing of so small a capacitance`);
  return { low: 1 - part, high: 1 + part };
}
