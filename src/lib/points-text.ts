import { parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';

/** `lines[i]` is the line, counted from 1, that `rows[i]` stands on: blank lines and notes hold no point. */
export type PointsRead =
  | { ok: true; rows: number[][]; lines: number[] }
  | { ok: false; reason: string; line?: number };

/**
 * Points, one a line, their numbers parted by blanks, tabs or semicolons: `10k 3m`. What begins with # is a note. `examples`
 * stand in the sentence that asks for a first line.
 */
export function readPoints(
  text: string,
  units: readonly UnitSymbol[],
  examples: readonly string[] = EXAMPLES,
): PointsRead {
  const rows: number[][] = [];
  const lines: number[] = [];
  const all = text.split(/\r\n|\r|\n/);
  for (let i = 0; i < all.length; i++) {
    const content = all[i].trim();
    const line = i + 1;
    if (content === '' || content.startsWith('#')) continue;
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
