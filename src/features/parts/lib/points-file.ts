/** Room for the longest table with many digits a number. */
export const MOST_BYTES = 512 * 1024;

export type PointsFile = { ok: true; text: string } | { ok: false; reason: string };

const isPoint = (line: string): boolean => /^\s*["']?[-+\u2212]?[\d.,]*\d/.test(line);

/** Headings before the first number become notes, so that they are kept and stand in nobody's way; quotes go. */
function headingsAsNotes(text: string): string {
  const lines = text.replaceAll('"', '').split(/\r\n|\r|\n/);
  const first = lines.findIndex((line) => isPoint(line));
  return lines
    .map((line, i) => (i < first && /^\s*[^#\s]/.test(line) ? `# ${line.trim()}` : line))
    .join('\n')
    .trim();
}

/** A text file with points as a field takes it, or why not. */
export async function readPointsFile(file: Pick<File, 'name' | 'size' | 'text'>): Promise<PointsFile> {
  const no = (why: string): PointsFile => ({ ok: false, reason: `${file.name}: ${why}` });
  if (file.size === 0) return no('the file is empty');
  if (file.size > MOST_BYTES) return no(`is larger than ${MOST_BYTES / 1024} kB`);
  let text: string;
  try {
    text = (await file.text()).replace(/^\ufeff/, '');
  } catch {
    return no('could not be read');
  }
  if (/[\0\ufffd]/.test(text)) return no('is not plain text (UTF-8)');
  if (!text.split(/\r\n|\r|\n/).some(isPoint)) return no('holds no numbers');
  return { ok: true, text: headingsAsNotes(text) };
}
