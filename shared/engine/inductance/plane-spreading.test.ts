import { describe, expect, it } from 'vitest';
import { pathInductance } from '../plane';
import { planeInductance_HPerSquare, planeStrip_H, spreading_H, spreadingBetween_H } from './plane-spreading';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('plane pair', () => {
  it('has μ₀h a square', () => {
    expect(planeInductance_HPerSquare(1e-4)).toBeCloseTo(1.2566e-10, 14);
    expect(planeStrip_H(1e-4, 0.03, 0.01)).toBeCloseTo(3 * planeInductance_HPerSquare(1e-4), 20);
  });

  it('spreads from ring to ring, and the rings add up', () => {
    expect(spreading_H(1e-4, 1e-3, 1e-3)).toBe(0);
    const parts = spreading_H(1e-4, 1e-4, 1e-3) + spreading_H(1e-4, 1e-3, 2e-2);
    expect(spreading_H(1e-4, 1e-4, 2e-2)).toBeCloseTo(parts, 20);
  });

  it('carries current between two contacts as two spreadings', () => {
    const both = spreading_H(1e-4, 2e-4, 0.01) + spreading_H(1e-4, 3e-3, 0.01);
    expect(spreadingBetween_H(1e-4, 0.01, 2e-4, 3e-3)).toBeCloseTo(both, 20);
    expect(spreadingBetween_H(1e-4, 0.01, 2e-4, 3e-3)).toBe(pathInductance(1e-4, 0.01, 2e-4, 3e-3));
    expect(spreadingBetween_H(1e-4, 0, 2e-4, 3e-3)).toBe(0);
  });

  it('names what it refuses, planes without a gap first of all', () => {
    for (const bad of [0, -1e-4, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => planeInductance_HPerSquare(bad)).toThrow(fault('spacing_m'));
      expect(() => planeStrip_H(bad, 1, 1)).toThrow(fault('spacing_m'));
      expect(() => planeStrip_H(1e-4, bad, 1)).toThrow(fault('length_m'));
      expect(() => planeStrip_H(1e-4, 1, bad)).toThrow(fault('width_m'));
      expect(() => spreading_H(bad, 1e-3, 1e-2)).toThrow(fault('spacing_m'));
      expect(() => spreading_H(1e-4, bad, 1e-2)).toThrow(fault('inner_m'));
      expect(() => spreading_H(1e-4, 1e-3, bad)).toThrow(fault('outer_m'));
      expect(() => spreadingBetween_H(bad, 0.01, 1e-3, 1e-3)).toThrow(fault('spacing_m'));
      expect(() => spreadingBetween_H(1e-4, 0.01, bad, 1e-3)).toThrow(fault('radius1_m'));
      expect(() => spreadingBetween_H(1e-4, 0.01, 1e-3, bad)).toThrow(fault('radius2_m'));
    }
    expect(() => spreadingBetween_H(1e-4, -0.01, 1e-3, 1e-3)).toThrow(fault('distance_m'));
    expect(() => spreading_H(1e-4, 1e-2, 1e-3)).toThrow(fault('outer_m'));
  });
});
