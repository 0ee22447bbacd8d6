import { describe, expect, it } from 'vitest';
import {
  COPPER_OHM_M,
  copperResistivity_ohmM,
  foilThickness_m,
  sheetResistance_ohm,
  skinDepth_m,
  stripResistance_ohm,
  surfaceResistance_ohm,
} from './copper';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });

describe('copper', () => {
  it('resists more when warm', () => {
    expect(copperResistivity_ohmM(20)).toBe(COPPER_OHM_M);
    expect(copperResistivity_ohmM(120) / COPPER_OHM_M).toBeCloseTo(1.393, 12);
    expect(copperResistivity_ohmM(-55)).toBeLessThan(COPPER_OHM_M);
  });

  it('carries current nearer its surface as 1/√f', () => {
    expect(skinDepth_m(4e6)).toBeCloseTo(skinDepth_m(1e6) / 2, 15);
    expect(surfaceResistance_ohm(1e8)).toBeCloseTo(COPPER_OHM_M / skinDepth_m(1e8), 15);
    expect(skinDepth_m(1e6, copperResistivity_ohmM(85))).toBeGreaterThan(skinDepth_m(1e6));
  });

  it('comes as foil by weight', () => {
    expect(foilThickness_m(2)).toBeCloseTo(2 * foilThickness_m(1), 18);
    expect(sheetResistance_ohm(foilThickness_m(1))).toBeCloseTo(5.06e-4, 6);
    expect(stripResistance_ohm(5e-4, 0.1, 1e-3)).toBeCloseTo(0.05, 14);
    expect(stripResistance_ohm(5e-4, 0, 1e-3)).toBe(0);
  });

  it('names what it refuses', () => {
    for (const bad of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => skinDepth_m(bad)).toThrow(fault('frequency_Hz'));
      expect(() => skinDepth_m(1e6, bad)).toThrow(fault('resistivity_ohmM'));
      expect(() => surfaceResistance_ohm(bad)).toThrow(fault('frequency_Hz'));
      expect(() => sheetResistance_ohm(bad)).toThrow(fault('thickness_m'));
      expect(() => foilThickness_m(bad)).toThrow(fault('ounces_perFt2'));
      expect(() => stripResistance_ohm(bad, 1, 1)).toThrow(fault('sheet_ohm'));
      expect(() => stripResistance_ohm(1, 1, bad)).toThrow(fault('width_m'));
    }
    expect(() => stripResistance_ohm(1, -1, 1)).toThrow(fault('length_m'));
    for (const bad of [-250, Number.NaN, Number.POSITIVE_INFINITY])
      expect(() => copperResistivity_ohmM(bad)).toThrow(fault('temperature_C'));
  });
});
