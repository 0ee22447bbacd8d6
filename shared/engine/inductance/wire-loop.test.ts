import { describe, expect, it } from 'vitest';
import { viaPairLog_H } from './via';
import { circularLoop_H, INTERNAL_H_PER_M, rectangularLoop_H } from './wire-loop';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('wire loops', () => {
  it('are alike from both sides', () => {
    expect(rectangularLoop_H(0.1, 0.03, 5e-4)).toBeCloseTo(rectangularLoop_H(0.03, 0.1, 5e-4), 18);
  });

  it('become two long wires when the rectangle is long', () => {
    const [length, gap, radius] = [10, 0.01, 5e-4];
    const ratio = rectangularLoop_H(length, gap, radius) / viaPairLog_H(length, gap, 2 * radius);
    expect(ratio).toBeCloseTo(1, 2);
  });

  it('take a square and a circle of one area for nearly the same', () => {
    const side = 0.0254;
    const ratio = rectangularLoop_H(side, side, 2.5e-4) / circularLoop_H(side / Math.sqrt(Math.PI), 2.5e-4);
    expect(ratio).toBeGreaterThan(1);
    expect(ratio).toBeLessThan(1.1);
  });

  it('have a little more when the current fills the wire', () => {
    const more = rectangularLoop_H(0.1, 0.05, 5e-4, 'uniform') - rectangularLoop_H(0.1, 0.05, 5e-4);
    expect(more).toBeCloseTo(0.3 * INTERNAL_H_PER_M, 18);
    const round = circularLoop_H(0.01, 5e-4, 'uniform') - circularLoop_H(0.01, 5e-4);
    expect(round).toBeCloseTo(0.02 * Math.PI * INTERNAL_H_PER_M, 18);
  });

  it('name what they refuse', () => {
    for (const bad of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => rectangularLoop_H(bad, 1, 1e-3)).toThrow(fault('a_m'));
      expect(() => rectangularLoop_H(1, bad, 1e-3)).toThrow(fault('b_m'));
      expect(() => rectangularLoop_H(1, 1, bad)).toThrow(fault('wireRadius_m'));
      expect(() => circularLoop_H(bad, 1e-3)).toThrow(fault('loopRadius_m'));
      expect(() => circularLoop_H(1, bad)).toThrow(fault('wireRadius_m'));
    }
    expect(() => rectangularLoop_H(1, 0.01, 5e-3)).toThrow(fault('wireRadius_m'));
    expect(() => circularLoop_H(1, 0.5)).toThrow(fault('wireRadius_m'));
  });
});
