import { describe, expect, it } from 'vitest';
import { MU0_H_PER_M } from '../constants';
import { microstrip_HPerM, microstripIpc_HPerM, microstripQuick_HPerM } from './microstrip';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('trace over a plane', () => {
  it('goes over into parallel plates when wide and into a wire when narrow', () => {
    const h = 1e-4;
    expect(microstrip_HPerM(1000 * h, h) / (MU0_H_PER_M / 1000)).toBeGreaterThan(0.98);
    expect(microstrip_HPerM(1000 * h, h) / (MU0_H_PER_M / 1000)).toBeLessThan(1);
    // A narrow strip is a wire of a quarter of its width for a radius: (μ₀/2π)·ln(8h/w).
    const wire = (MU0_H_PER_M / (2 * Math.PI)) * Math.log(8e4);
    expect(microstrip_HPerM(1e-4 * h, h) / wire).toBeCloseTo(1, 4);
  });

  it('falls with width, rises with height and depends on their ratio only', () => {
    for (let u = 0.1; u < 50; u *= 1.3) {
      expect(microstrip_HPerM(1.3 * u, 1)).toBeLessThan(microstrip_HPerM(u, 1));
      expect(microstrip_HPerM(u * 2e-4, 2e-4)).toBeCloseTo(microstrip_HPerM(u, 1), 16);
    }
  });

  it('lies above the rougher forms, by as much as their comments say', () => {
    const against = (rough: number, u: number) => rough / microstrip_HPerM(u, 1);
    expect(against(microstripIpc_HPerM(0.5, 1, 0.01), 0.5)).toBeCloseTo(0.962, 3);
    expect(against(microstripIpc_HPerM(1, 1, 0.14), 1)).toBeCloseTo(0.876, 3);
    expect(against(microstripQuick_HPerM(1, 1), 1)).toBeCloseTo(0.858, 3);
  });

  it('names what it refuses', () => {
    for (const bad of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      for (const form of [microstrip_HPerM, microstripQuick_HPerM]) {
        expect(() => form(bad, 1e-4)).toThrow(fault('width_m'));
        expect(() => form(1e-4, bad)).toThrow(fault('height_m'));
      }
      expect(() => microstripIpc_HPerM(1e-4, 1e-4, bad)).toThrow(fault('thickness_m'));
    }
    expect(() => microstripIpc_HPerM(10, 1, 0.1)).toThrow(fault('width_m'));
    expect(() => microstripQuick_HPerM(7, 1)).toThrow(fault('width_m'));
  });
});
