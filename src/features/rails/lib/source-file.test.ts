import { describe, expect, it } from 'vitest';
import { MOST_BYTES, readSourceFile } from './source-file';

const read = (text: string, name = 'buck.csv') => readSourceFile(new File([text], name));

describe('a file of source points', () => {
  it('is taken with its headings as notes, so that every line keeps its number', async () => {
    const answer = await read(
      '\ufeffZ of the buck\r\n\r\n"f (Hz)","Re","Im"\r\n1000,"0.001",0.002\r\n1e4,0.002,0.01\r\n',
    );
    expect(answer).toEqual({
      ok: true,
      text: '# Z of the buck\n\n# "f (Hz)","Re","Im"\n1000,0.001,0.002\n1e4,0.002,0.01',
      note: 'buck.csv: 2 points read, 2 lines above the first number skipped',
    });
  });

  it('without headings says only how many points it holds', async () => {
    expect(await read('# by hand\n1k 1m 2m')).toMatchObject({ note: 'buck.csv: 1 point read' });
    expect(await read('f;re;im\n1000;0,001;-0,002')).toMatchObject({
      ok: true,
      note: 'buck.csv: 1 point read, 1 line above the first number skipped',
    });
  });

  it('says which line is wrong, as an editor counts them', async () => {
    expect(await read('f re im\n1k 1m 2m\n\n2k 1m')).toEqual({
      ok: false,
      reason: 'buck.csv: line 4: 3 numbers are wanted, 2 stand there',
    });
    expect(await read('1k 1m 2m\nend of data 3')).toMatchObject({
      reason: expect.stringContaining('line 2'),
    });
  });

  it('is refused when it is empty, too large or no text', async () => {
    expect(await read('')).toMatchObject({ reason: 'buck.csv: the file is empty' });
    expect(await read('only words')).toMatchObject({ reason: 'buck.csv: no line begins with a number' });
    expect(await read('1k 1m\0 2m')).toMatchObject({ reason: expect.stringContaining('not plain text') });
    const text = async () => {
      throw new Error('must not be read');
    };
    expect(await readSourceFile({ name: 'z.txt', size: MOST_BYTES + 1, text })).toMatchObject({
      reason: 'z.txt: the file is larger than 1 MB',
    });
    expect(await readSourceFile({ name: 'z.txt', size: 10, text })).toMatchObject({
      reason: 'z.txt: the file could not be read',
    });
  });
});
