import { describe, expect, it } from 'vitest';
import { biasCurveSchema, temperatureCurveSchema } from './part.schema';

const said = (points: number[][]) =>
  temperatureCurveSchema.safeParse(points).error?.issues.map((issue) => issue.message);

describe('a curve over temperature', () => {
  it('is 1 at 25 °C within 5 %, straight between its points', () => {
    expect(
      said([
        [-55, 0.9],
        [25, 1],
        [85, 0.9],
      ]),
    ).toBeUndefined();
    expect(
      said([
        [25, 0.96],
        [85, 0.9],
      ]),
    ).toBeUndefined();
    expect(
      said([
        [-55, 0.9],
        [25, 1.05],
      ]),
    ).toBeUndefined();
    // Half way between 0.94 at 20 °C and 1.0 at 30 °C: 0.97.
    expect(
      said([
        [20, 0.94],
        [30, 1],
      ]),
    ).toBeUndefined();
    const off = (at: string) => [`C ÷ C(25 °C) must be 1 at 25 °C; this curve is ${at} there`];
    expect(
      said([
        [20, 0.9],
        [30, 0.96],
      ]),
    ).toEqual(off('0.93'));
    expect(
      said([
        [-55, 0.9],
        [25, 1.06],
        [125, 1],
      ]),
    ).toEqual(off('1.06'));
  });

  it('reaches 25 °C', () => {
    const unreached = ['the curve must reach 25 °C, which its factors are counted from'];
    expect(
      said([
        [-55, 0.9],
        [24, 1],
      ]),
    ).toEqual(unreached);
    expect(
      said([
        [26, 1],
        [85, 0.9],
      ]),
    ).toEqual(unreached);
  });
});

describe('a curve over bias', () => {
  it('may rise a little, not by more than half', () => {
    expect(
      biasCurveSchema.safeParse([
        [0, 1],
        [2, 1.5],
        [5, 0.4],
      ]).success,
    ).toBe(true);
    expect(
      biasCurveSchema.safeParse([
        [0, 1],
        [2, 1.51],
      ]).error?.issues,
    ).toMatchObject([{ path: [1, 1], message: 'C ÷ C(0 V) is above 1.5' }]);
  });
});
