import type { UnitSymbol } from '@shared/units/quantity';
import { type PointsRead, readPoints } from '@/lib/points-text';

/** The text that was read last for each list of units. */
const last = new Map<string, { text: string; read: PointsRead }>();

/** As `readPoints`, but a text that has just been read is not read again: a long table is asked for with every key typed elsewhere. */
export function readPointsOnce(text: string, units: readonly UnitSymbol[]): PointsRead {
  const key = units.join(' ');
  const before = last.get(key);
  if (before?.text === text) return before.read;
  const read = readPoints(text, units);
  last.set(key, { text, read });
  return read;
}
