import { parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';
import { headerFault } from './points-header';

/** `lines[i]` is the line, counted from 1, that `rows[i]` stands on: blank lines and notes hold no point. */
export type PointsRead =
  | { ok: true; rows: number[][]; lines: number[] }
  | { ok: false; reason: string; line?: number };

/**
 * Points, one a line, their numbers parted by blanks, tabs or semicolons: `10k 3m`. What begins with # is a note; a note that
 * says other units than are wanted stops the reading. `examples` stand in the sentence that asks for a first line.
 */
export function readPoints(
  text: string,
  units: readonly UnitSymbol[],
  examples: readonly string[] = EXAMPLES,
): PointsRead {
  const rows: number[][] = [];
  const lines: number[] = [];
  const all = text.split(/\r\n|\r|\n/);
  const misled = misledBy(all, units);
  if (misled) return misled;
  for (let i = 0; i < all.length; i++) {
    const content = all[i].trim();
    const line = i + 1;
    if (!holdsPoint(content)) continue;
    const cells = cellsOf(content, units.length);
    if (cells.length !== units.length)
      return {
        ok: false,
        reason: `line ${line}: ${units.length} numbers are wanted, ${cells.length} ${cells.length === 1 ? 'stands' : 'stand'} there`,
        line,
      };
    const row: number[] = [];
    for (let k = 0; k < cells.length; k++) {
      const parsed = parseQuantity(cells[k], units[k]);
      if (!parsed.ok) return { ok: false, reason: `line ${line}: ${parsed.reason}`, line };
      row.push(parsed.value);
    }
    rows.push(row);
    lines.push(line);
  }
  return rows.length === 0
    ? { ok: false, reason: `write at least one line, e.g. ${examples.slice(0, units.length).join(' ')}` }
    : { ok: true, rows, lines };
}

const holdsPoint = (content: string): boolean => content !== '' && !content.startsWith('#');

/** The first note that says something else of the numbers than they are read as. */
function misledBy(all: readonly string[], units: readonly UnitSymbol[]): PointsRead | null {
  const first = all.find((line) => holdsPoint(line.trim()));
  const cells = cellsOf(first?.trim() ?? '', units.length);
  for (let i = 0; i < all.length; i++) {
    if (!all[i].trim().startsWith('#')) continue;
    const fault = headerFault(all[i], units, cells);
    if (fault) return { ok: false, reason: `line ${i + 1}: ${fault}`, line: i + 1 };
  }
  return null;
}

const EXAMPLES = ['10k', '3m', '5m'];

/** The numbers of a line: parted by blanks, tabs or semicolons, or, where that does not give enough, by commas. */
function cellsOf(line: string, wanted: number): string[] {
  const cells = line
    .split(/[;\t ]+/)
    .map((cell) => cell.replace(/,$/, ''))
    .filter(Boolean);
  if (cells.length === wanted) return cells;
  const byComma = line.split(/\s*[,;]\s*/).filter(Boolean);
  return byComma.length === wanted || byComma.length > cells.length ? byComma : cells;
}
