import { describe, expect, it } from 'vitest';
import { EngineError } from './errors';
import { flatTarget, kneeFrequency, maskTarget, targetAt, targetFromStep, targetSegment } from './target';

describe('target impedance', () => {
  it('is exact on a flat target and at the corners of a mask, and log–log between them', () => {
    expect(targetAt(flatTarget(0.01), 12345)).toBe(0.01);
    const mask = maskTarget([
      [1e4, 0.01],
      [1e6, 0.01],
      [1e8, 1],
    ]);
    expect(targetAt(mask, 1)).toBe(0.01);
    expect(targetAt(mask, 1e9)).toBe(1);
    expect(targetAt(mask, 1e7)).toBeCloseTo(0.1, 14);
    expect(targetSegment(mask, 1e7).slope).toBeCloseTo(1, 14);
    expect(targetSegment(mask, 1e5).slope).toBe(0);
  });

  it('comes from ripple and step', () => {
    expect(targetFromStep(0.9, 3, 9)).toBeCloseTo(3e-3, 15);
    expect(() => targetFromStep(1, 3, 0)).toThrow(EngineError);
    expect(kneeFrequency(10e-9)).toBeCloseTo(35e6, 3);
    expect(kneeFrequency(10e-9, 0.5)).toBeCloseTo(50e6, 3);
  });

  it('refuses masks that do not rise or are not positive, naming the point', () => {
    const field = (points: [number, number][]) => {
      try {
        maskTarget(points);
      } catch (error) {
        return error instanceof EngineError ? error.field : null;
      }
      return null;
    };
    expect(field([])).toBe('target.points');
    expect(
      field([
        [1, 1],
        [1, 2],
      ]),
    ).toBe('target.points[1]');
    expect(field([[1, 0]])).toBe('target.points[0]');
    expect(field([[0, 1]])).toBe('target.points[0]');
    expect(field([[Number.NaN, 1]])).toBe('target.points[0]');
  });
});
