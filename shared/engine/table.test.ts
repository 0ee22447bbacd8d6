import { describe, expect, it } from 'vitest';
import { EngineError } from './errors';
import { compileRail, railImpedance, scratch } from './rail';
import { fitSeries, isExtrapolated, prepareTable, tableImpedance } from './table';

const frequencies = Float64Array.from({ length: 41 }, (_, i) => 1e4 * 10 ** (i / 10));
const rlc = (r: number, l: number, c: number) => ({
  frequency_Hz: frequencies,
  re_ohm: frequencies.map(() => r),
  im_ohm: frequencies.map((f) => 2 * Math.PI * f * l - 1 / (2 * Math.PI * f * c)),
});

describe('an impedance table', () => {
  it('gives its points exactly and a pure inductor between them', () => {
    const table = prepareTable(
      {
        frequency_Hz: Float64Array.of(1e5, 1e7),
        re_ohm: Float64Array.of(0, 0),
        im_ohm: Float64Array.of(1e-3, 1e-1),
      },
      'source.points',
    );
    const out = new Float64Array(4);
    tableImpedance(table, 1e6, out);
    expect(out[1]).toBeCloseTo(1e-2, 14);
    expect(out[3] / out[1]).toBeCloseTo(1, 12);
    tableImpedance(table, 1e5, out);
    expect(out[1]).toBeCloseTo(1e-3, 15);
  });

  it('is continued outside by the series R–L–C that fits it', () => {
    const fit = fitSeries(rlc(0.01, 1e-9, 1e-6));
    expect(fit.resistance_ohm).toBeCloseTo(0.01, 12);
    expect(fit.inductance_H / 1e-9).toBeCloseTo(1, 9);
    expect(1 / fit.elastance_perF / 1e-6).toBeCloseTo(1, 9);
    const table = prepareTable(rlc(0.01, 1e-9, 1e-6), 'table');
    expect(isExtrapolated(table, 1e3)).toBe(true);
    expect(isExtrapolated(table, 1e6)).toBe(false);
    const out = new Float64Array(4);
    tableImpedance(table, 1e3, out);
    const omega = 2 * Math.PI * 1e3;
    expect(out[1]).toBeCloseTo(omega * 1e-9 - 1 / (omega * 1e-6), 6);
  });

  it('goes on without a step at its ends', () => {
    const bent = { ...rlc(0.01, 1e-9, 1e-6), re_ohm: frequencies.map((f) => 0.01 + 2e-8 * f) };
    const table = prepareTable(bent, 'table');
    const inside = new Float64Array(4);
    const outside = new Float64Array(4);
    for (const end of [1e4, 1e8]) {
      tableImpedance(table, end, inside);
      tableImpedance(table, end === 1e4 ? end * 0.9999999 : end * 1.0000001, outside);
      expect(Math.hypot(outside[0] - inside[0], outside[1] - inside[1])).toBeLessThan(
        1e-5 * Math.hypot(inside[0], inside[1]),
      );
    }
  });

  it('refuses what no passive table can hold, naming the row', () => {
    const field = (f: number[], re: number[], im: number[]) => {
      try {
        prepareTable(
          {
            frequency_Hz: Float64Array.from(f),
            re_ohm: Float64Array.from(re),
            im_ohm: Float64Array.from(im),
          },
          'points',
        );
      } catch (error) {
        return error instanceof EngineError ? error.field : String(error);
      }
      return null;
    };
    expect(field([1], [1], [1])).toBe('points');
    expect(field([1, 1], [1, 1], [1, 1])).toBe('points[1]');
    expect(field([1, 2], [1, -1], [1, 1])).toBe('points[1]');
    expect(field([1, 2], [1, 0], [1, 0])).toBe('points[1]');
    expect(field([0, 2], [1, 1], [1, 1])).toBe('points[0]');
    expect(field([1, 2], [1, Number.NaN], [1, 1])).toBe('points[1]');
  });

  it('serves as a source', () => {
    const rail = compileRail({
      source: { kind: 'table', table: rlc(0.01, 1e-9, 1e-3) },
      lines: [],
      observe: 'pins',
    });
    const out = scratch();
    railImpedance(rail, 1e6, out);
    expect(out[0]).toBeCloseTo(0.01, 4);
  });
});
