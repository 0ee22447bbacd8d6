import { readPoints } from '@/lib/points-text';

/** Room for 20 000 points with many digits. */
export const MOST_BYTES = 1024 * 1024;

export type SourceFile = { ok: true; text: string; note: string } | { ok: false; reason: string };

/** A line that begins with a number, quoted or not. */
const isPoint = (line: string): boolean => /^\s*["']?[-+\u2212]?[.,]?\d/.test(line);

const isBlank = (line: string): boolean => line.trim() === '' || line.trim().startsWith('#');

/**
 * A file of points (frequency, Re, Im) as the form's field takes it: what stands above the first number becomes notes, so that
 * every line keeps its number. Says what was skipped, or which line is wrong.
 */
export async function readSourceFile(file: Pick<File, 'name' | 'size' | 'text'>): Promise<SourceFile> {
  const no = (why: string): SourceFile => ({ ok: false, reason: `${file.name}: ${why}` });
  if (file.size === 0) return no('the file is empty');
  if (file.size > MOST_BYTES) return no('the file is larger than 1 MB');
  let content: string;
  try {
    content = (await file.text()).replace(/^\ufeff/, '');
  } catch {
    return no('the file could not be read');
  }
  if (/[\0\ufffd]/.test(content)) return no('the file is not plain text (UTF-8)');
  const lines = content.split(/\r\n|\r|\n/);
  const first = lines.findIndex(isPoint);
  if (first < 0) return no('no line begins with a number');
  const heads = lines.slice(0, first).filter((line) => !isBlank(line)).length;
  const text = lines
    .map((line, i) => (i < first ? asNote(line) : line.replace(/["']/g, '')))
    .join('\n')
    .trimEnd();
  const read = readPoints(text, ['Hz', 'Ω', 'Ω']);
  if (!read.ok) return no(read.reason);
  return { ok: true, text, note: `${file.name}: ${countText(read.rows.length)} read${skippedText(heads)}` };
}

const asNote = (line: string): string => (isBlank(line) ? line : `# ${line.trim()}`);
const countText = (count: number) => `${count} ${count === 1 ? 'point' : 'points'}`;
const skippedText = (heads: number) =>
  heads === 0 ? '' : `, ${heads} ${heads === 1 ? 'line' : 'lines'} above the first number skipped`;
