import { describe, expect, it } from 'vitest';
import { readPoints } from './points-text';

describe('points, one a line', () => {
  it('reads numbers as an engineer types them, with notes and blank lines between', () => {
    expect(readPoints('10k 3m\n1M;10m\n# note\n', ['Hz', 'Ω'])).toEqual({
      ok: true,
      rows: [
        [1e4, 3e-3],
        [1e6, 1e-2],
      ],
      lines: [1, 2],
    });
    expect(readPoints('1M, 10m', ['Hz', 'Ω'])).toMatchObject({ rows: [[1e6, 1e-2]] });
    expect(readPoints('1e6,0.01,0.02', ['Hz', 'Ω', 'Ω'])).toMatchObject({ rows: [[1e6, 0.01, 0.02]] });
    expect(readPoints('−55\t0.93\r\n\r\n# hot\r\n125\t0,9', ['', ''])).toEqual({
      ok: true,
      rows: [
        [-55, 0.93],
        [125, 0.9],
      ],
      lines: [1, 4],
    });
  });

  it('says which line is wrong, counting those that hold no point', () => {
    expect(readPoints('10k 3m\n\n# note\n1M', ['Hz', 'Ω'])).toEqual({
      ok: false,
      reason: 'line 4: 2 numbers are wanted, 1 stands there',
      line: 4,
    });
    expect(readPoints('1e3,0.01,0.001\n2e3,0.01', ['Hz', 'Ω', 'Ω'])).toMatchObject({
      reason: 'line 2: 3 numbers are wanted, 2 stand there',
    });
    expect(readPoints('10k 3m\n1M 2 V', ['Hz', 'Ω'])).toMatchObject({ ok: false, line: 2 });
    expect(readPoints('10k 3m\n1M 2V', ['Hz', 'Ω'])).toMatchObject({
      reason: expect.stringMatching(/^line 2: “V”/),
    });
  });

  it('asks for a first line by example', () => {
    expect(readPoints('', ['Hz', 'Ω', 'Ω'])).toMatchObject({ reason: expect.stringContaining('10k 3m 5m') });
    expect(readPoints('# only a note', ['V', ''], ['3.3', '0.8'])).toMatchObject({
      reason: 'write at least one line, e.g. 3.3 0.8',
    });
  });
});
