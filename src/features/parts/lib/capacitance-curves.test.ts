import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import {
  biasCurves,
  knownTemperatures,
  shownTemperatures,
  stretches,
  temperatureCurves,
} from './capacitance-curves';
import { CATALOGUE } from './situation';

const part: DocumentPart & { rated_voltage_V: number } = {
  id: 'C-1',
  capacitance_F: 1e-5,
  esr_ohm: 0.003,
  esl_H: 5e-10,
  mount_H: 0,
  technology: 'ceramic',
  dielectric: 'X5R',
  case: '0603',
  tolerance: 'K',
  rated_voltage_V: 6.3,
};
const own: DocumentPart = {
  ...part,
  temperature_curve: [
    [-40, 0.9],
    [25, 1],
    [85, 0.92],
  ],
};

describe('capacitance over temperature', () => {
  it('spans what the curve says, else the code, else −55 … 125 °C', () => {
    expect(knownTemperatures(own)).toEqual([-40, 85]);
    expect(knownTemperatures(part)).toEqual([-55, 85]);
    expect(knownTemperatures({ ...part, dielectric: '??' })).toEqual([-55, 125]);
    expect(knownTemperatures({ technology: 'tantalum', dielectric: 'X5R' })).toEqual([-55, 125]);
    expect(shownTemperatures(part, 110)).toEqual([-55, 110]);
    expect(shownTemperatures(part, -60)).toEqual([-60, 85]);
  });

  it('has a band where only limits are known, and none where a curve is', () => {
    const { chosen } = temperatureCurves(part, { ...CATALOGUE, temperature_C: 60 });
    const cold = chosen[0];
    expect(cold).toMatchObject({ x: -55, estimated: true, capacitance_F: 1e-5 });
    // X5R: ±15 %
    expect(cold.low_F).toBeCloseTo(0.85e-5, 12);
    expect(cold.high_F).toBeCloseTo(1.15e-5, 12);
    const known = temperatureCurves(own, CATALOGUE).chosen;
    for (const { low_F, high_F, estimated } of known) {
      expect(high_F).toBeCloseTo(low_F, 15);
      expect(estimated).toBe(false);
    }
    expect(known.map(({ x }) => x)).toContain(25);
  });

  it('keeps the band where it is when its low end is chosen', () => {
    const low = temperatureCurves(part, { ...CATALOGUE, capacitance: 'low' }).chosen[0];
    // Letter K: 0.9 of it, at the lower limit 0.85.
    expect(low.capacitance_F).toBeCloseTo(1e-5 * 0.9 * 0.85, 12);
    expect(low.low_F).toBeCloseTo(low.capacitance_F, 15);
    expect(low.high_F).toBeCloseTo(1e-5 * 0.9 * 1.15, 12);
  });

  it('goes on beyond the curve as an estimate, and does without the chosen curve where it is refused', () => {
    const wide = temperatureCurves(own, { ...CATALOGUE, temperature_C: 125 });
    expect(wide.range).toEqual([-40, 125]);
    expect(wide.chosen.at(-1)).toMatchObject({ x: 125, estimated: true });
    const refused = temperatureCurves(own, { ...CATALOGUE, voltage_V: 7 });
    expect(refused.chosen).toEqual([]);
    expect(refused.alone.length).toBeGreaterThan(100);
  });
});

describe('capacitance over bias', () => {
  it('spans nothing to the rating and never asks for more', () => {
    const { range, chosen, alone } = biasCurves(part, { ...CATALOGUE, capacitance: 'low' });
    expect(range).toEqual([0, 6.3]);
    expect(chosen[0]).toMatchObject({ x: 0, estimated: false });
    expect(chosen.at(-1)).toMatchObject({ x: 6.3, estimated: true });
    expect(alone[0].capacitance_F).toBe(1e-5);
    expect(chosen[0].capacitance_F).toBeCloseTo(0.9e-5, 12);
    for (let i = 1; i < alone.length; i++)
      expect(alone[i].capacitance_F).toBeLessThan(alone[i - 1].capacitance_F);
  });

  it('is refused for a part whose tolerance letter does not go with its value', () => {
    expect(() => biasCurves({ ...part, tolerance: 'B' }, CATALOGUE)).toThrow(/below 10 pF/);
  });
});

describe('stretches of a curve', () => {
  const point = (x: number, estimated: boolean) => ({
    x,
    capacitance_F: 1,
    low_F: 1,
    high_F: 1,
    estimated,
  });

  it('are estimated where either end is, and meet', () => {
    const found = stretches([
      point(0, false),
      point(1, false),
      point(2, true),
      point(3, false),
      point(4, false),
    ]);
    expect(found.map(({ estimated, points }) => [estimated, points.map(({ x }) => x)])).toEqual([
      [false, [0, 1]],
      [true, [1, 2, 3]],
      [false, [3, 4]],
    ]);
    expect(stretches([])).toEqual([]);
  });
});
