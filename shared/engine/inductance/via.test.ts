import { describe, expect, it } from 'vitest';
import { parallelPairs_H, singleVia_H, viaPair_H, viaPairLog_H } from './via';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const BAD = [0, -1e-3, Number.NaN, Number.POSITIVE_INFINITY];

describe('vias', () => {
  it('have a loop that grows with height and spacing and shrinks with thicker barrels', () => {
    const pair = viaPair_H(3e-4, 1e-3, 2.5e-4);
    expect(pair).toBeCloseTo(1.2e-10 * Math.acosh(4), 20);
    expect(viaPair_H(6e-4, 1e-3, 2.5e-4)).toBeCloseTo(2 * pair, 20);
    expect(viaPair_H(3e-4, 1.2e-3, 2.5e-4)).toBeGreaterThan(pair);
    expect(viaPair_H(3e-4, 1e-3, 3e-4)).toBeLessThan(pair);
  });

  it('come to next to nothing when they all but touch, where thin wires would not', () => {
    expect(viaPair_H(1e-3, 1.0001e-3, 1e-3)).toBeLessThan(1e-11);
    expect(viaPairLog_H(1e-3, 1.0001e-3, 1e-3)).toBeGreaterThan(2e-10);
  });

  it('share the current between pairs as far as these leave each other alone', () => {
    expect(parallelPairs_H(1e-9, 4, 0)).toBe(0.25e-9);
    expect(parallelPairs_H(1e-9, 4, 1)).toBe(1e-9);
    expect(parallelPairs_H(1e-9, 2, 0.3)).toBeCloseTo(0.65e-9, 20);
    expect(parallelPairs_H(1e-9, 1, 0.7)).toBe(1e-9);
  });

  it('name what they refuse', () => {
    for (const bad of BAD) {
      expect(() => singleVia_H(bad, 1e-4)).toThrow(fault('height_m'));
      expect(() => singleVia_H(1e-3, bad)).toThrow(fault('diameter_m'));
      for (const pair of [viaPair_H, viaPairLog_H]) {
        expect(() => pair(bad, 1e-3, 1e-4)).toThrow(fault('height_m'));
        expect(() => pair(1e-3, bad, 1e-4)).toThrow(fault('spacing_m'));
        expect(() => pair(1e-3, 1e-3, bad)).toThrow(fault('diameter_m'));
      }
    }
    expect(() => viaPair_H(1e-3, 1e-4, 1e-4)).toThrow(fault('spacing_m'));
    expect(() => singleVia_H(1e-5, 1e-3)).toThrow(fault('height_m'));
    expect(() => parallelPairs_H(-1, 1, 0)).toThrow(fault('pair_H'));
    expect(() => parallelPairs_H(1e-9, 1.5, 0)).toThrow(fault('pairs'));
    expect(() => parallelPairs_H(1e-9, 0, 0)).toThrow(fault('pairs'));
    expect(() => parallelPairs_H(1e-9, 2, 1.1)).toThrow(fault('coupling'));
    expect(() => parallelPairs_H(1e-9, 2, -0.1)).toThrow(fault('coupling'));
  });
});
