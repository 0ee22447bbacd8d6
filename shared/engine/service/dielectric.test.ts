import { describe, expect, it } from 'vitest';
import { readDielectric } from './dielectric';

const combine = (...sets: string[]): string[] =>
  sets.reduce<string[]>((all, set) => all.flatMap((head) => [...set].map((sign) => head + sign)), ['']);

describe('dielectric codes', () => {
  it('reads every class 2 code of the table, and only class 3 for the steep ones', () => {
    const codes = combine('XYZ', '2456789', 'ABCDEFPRSTUV');
    expect(codes).toHaveLength(252);
    for (const code of codes) {
      const read = readDielectric(code);
      expect(read).toMatchObject({ code, class: /[UV]$/.test(code) ? 3 : 2, reference_C: 25 });
      expect(read && read.high_C > read.low_C).toBe(true);
    }
  });

  it('reads every class 1 code whose multiplier the tables agree on', () => {
    for (const code of combine('CBLAMPRSTVU', '0123678', 'GHJKLMN'))
      expect(readDielectric(code)).toMatchObject({ code, class: 1, reference_C: 25 });
    for (const code of combine('CBLAMPRSTVU', '459', 'GHJKLMN')) expect(readDielectric(code)).toBeNull();
  });

  it('gives limits as fractions and slopes in ppm/K', () => {
    expect(readDielectric('X7R')).toEqual({
      code: 'X7R',
      class: 2,
      low_C: -55,
      high_C: 125,
      reference_C: 25,
      lowest: -0.15,
      highest: 0.15,
    });
    expect(readDielectric('Y5V')).toMatchObject({ low_C: -30, high_C: 85, lowest: -0.82, highest: 0.22 });
    expect(readDielectric('Z5U')).toMatchObject({ low_C: 10, high_C: 85, lowest: -0.56, highest: 0.22 });
    expect(readDielectric('U2J')).toMatchObject({ slope_ppmPerK: -750, tolerance_ppmPerK: 120 });
    expect(Object.is((readDielectric('C0G') as { slope_ppmPerK: number }).slope_ppmPerK, 0)).toBe(true);
  });

  it('takes what people type', () => {
    for (const typed of ['C0G', 'c0g', ' COG ', 'NP0', 'npo'])
      expect(readDielectric(typed)).toMatchObject({ code: 'C0G', class: 1, tolerance_ppmPerK: 30 });
    expect(readDielectric(' x5r\n')?.code).toBe('X5R');
  });

  it('reads IEC short codes from 20 °C', () => {
    expect(readDielectric('2R1')).toMatchObject({
      class: 2,
      reference_C: 20,
      low_C: -55,
      high_C: 125,
      lowest: -0.15,
    });
    expect(readDielectric('2F4')).toMatchObject({
      class: 3,
      low_C: -25,
      high_C: 85,
      lowest: -0.8,
      highest: 0.3,
    });
    expect(readDielectric('2d6')).toMatchObject({ class: 2, low_C: 10, lowest: -0.3, highest: 0.2 });
  });

  it.each([
    '',
    'X',
    'X7',
    'X7RR',
    'X3R',
    'W7R',
    'X7G',
    'X7Z',
    'C0R',
    '2A1',
    '2R5',
    '2R',
    'PP',
    'polymer',
    '__proto__',
  ])('knows no %s', (code) => expect(readDielectric(code)).toBeNull());
});
