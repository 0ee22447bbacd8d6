import { describe, expect, it } from 'vitest';
import { partCurve, resonance_Hz, seriesMagnitude } from './part-curve';

const part = { capacitance_F: 100e-9, esr_ohm: 0.02, esl_H: 0.4e-9 };

describe('the curve of one capacitor', () => {
  it('falls to its ESR at its self-resonance', () => {
    const f0 = resonance_Hz(part, 1e-9);
    // 1/(2π√(1 nH · 100 nF)) = 15.915 MHz
    expect(f0).toBeCloseTo(15_915_494, -1);
    expect(seriesMagnitude(part, 1e-9, f0 ?? 0)).toBeCloseTo(0.02, 9);
    const lowest = Math.min(...partCurve(part, 1e-9, [1e4, 1e9], 1e-6).map(([, z]) => z));
    expect(lowest).toBeCloseTo(0.02, 9);
  });

  it('has none without inductance, and stays above the floor without ESR', () => {
    expect(resonance_Hz(part, 0)).toBeNull();
    const ideal = partCurve({ ...part, esr_ohm: 0 }, 1e-9, [1e4, 1e9], 1e-5);
    expect(Math.min(...ideal.map(([, z]) => z))).toBe(1e-5);
  });

  it('rises from frequency to frequency and covers both ends', () => {
    const points = partCurve(part, 1e-9, [1e4, 1e9], 1e-6);
    expect(points[0][0]).toBe(1e4);
    expect(points[points.length - 1][0]).toBeCloseTo(1e9, 0);
    for (let i = 1; i < points.length; i++) expect(points[i][0]).toBeGreaterThan(points[i - 1][0]);
  });
});
