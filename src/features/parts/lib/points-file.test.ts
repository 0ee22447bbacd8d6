import { describe, expect, it } from 'vitest';
import { MOST_BYTES, readPointsFile } from './points-file';

const file = (text: string, name = 'curve.csv') => new File([text], name);

describe('a file with points', () => {
  it('keeps its headings as notes and its points as they stand', async () => {
    expect(await readPointsFile(file('\ufeff"Voltage";"C/C0"\r\n\r\n0;1\r\n3.3;0.62\r\n'))).toEqual({
      ok: true,
      text: '# Voltage;C/C0\n\n0;1\n3.3;0.62',
    });
    expect(await readPointsFile(file('# note\n-55 0.9\n25 1'))).toEqual({
      ok: true,
      text: '# note\n-55 0.9\n25 1',
    });
  });

  it.each([
    ['', 'the file is empty'],
    ['only words\nand more', 'holds no numbers'],
    ['0 1\n1\0 2', 'is not plain text'],
    ['1'.repeat(MOST_BYTES + 1), 'larger than 512 kB'],
  ])('says why not', async (text, reason) => {
    const answer = await readPointsFile(file(text, 'odd.txt'));
    expect(answer).toEqual({ ok: false, reason: expect.stringContaining(reason) });
    expect(answer).toMatchObject({ reason: expect.stringMatching(/^odd\.txt: /) });
  });

  it('says so when it cannot be read', async () => {
    const gone = { name: 'gone.csv', size: 5, text: () => Promise.reject(new Error('moved')) };
    expect(await readPointsFile(gone)).toEqual({ ok: false, reason: 'gone.csv: could not be read' });
  });
});
