import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { branchCurve, lowestPoint, magnitude_ohm, partBranch, partInSituation } from './branch-curve';
import { partCurves } from './part-curves';
import { CATALOGUE } from './situation';

const part: DocumentPart = {
  id: 'C-1',
  capacitance_F: 100e-9,
  esr_ohm: 0.02,
  esl_H: 0.4e-9,
  mount_H: 0.6e-9,
  rated_voltage_V: 10,
  technology: 'ceramic',
  bias_curve: [
    [0, 1],
    [10, 0.25],
  ],
};
const band: [number, number] = [1e4, 1e9];

describe('the curve of one capacitor', () => {
  it('falls to its ESR at its self-resonance', () => {
    const lowest = lowestPoint(branchCurve(partBranch(part, 'mounted'), band, 1e-6));
    // 1/(2π√(1 nH · 100 nF)) = 15.915 MHz
    expect(lowest?.[0]).toBeCloseTo(15_915_494, -1);
    expect(lowest?.[1]).toBeCloseTo(0.02, 9);
  });

  it('stays above the floor without ESR, and has no lowest point without inductance', () => {
    const ideal = { ...part, esr_ohm: 0 };
    expect(Math.min(...branchCurve(partBranch(ideal, 'mounted'), band, 1e-5).map(([, z]) => z))).toBe(1e-5);
    const bare = { ...part, esl_H: 0 };
    expect(lowestPoint(branchCurve(partBranch(bare, 'alone'), band, 1e-9))).toBeNull();
  });

  it('rises from frequency to frequency and covers both ends', () => {
    const points = branchCurve(partBranch(part, 'mounted'), band, 1e-6);
    expect(points[0][0]).toBe(1e4);
    expect(points[points.length - 1][0]).toBeCloseTo(1e9, 0);
    for (let i = 1; i < points.length; i++) expect(points[i][0]).toBeGreaterThan(points[i - 1][0]);
  });

  it('goes by the ESR table where there is one', () => {
    const lossy = partBranch(
      {
        ...part,
        esr_table: [
          [1e4, 0.5],
          [1e8, 0.005],
        ],
      },
      'mounted',
    );
    // Two decades below the 15.9 MHz resonance of log–log straight ESR: 0.5·(f/10 kHz)^−0.5
    const f0 = 1 / (2 * Math.PI * Math.sqrt(1e-9 * 100e-9));
    expect(magnitude_ohm(lossy, f0)).toBeCloseTo(0.5 * (f0 / 1e4) ** -0.5, 6);
  });
});

describe('a part in a situation', () => {
  it('resonates higher with the capacitance that the bias leaves it', () => {
    const at = { ...CATALOGUE, voltage_V: 10 };
    const lowest = lowestPoint(branchCurve(partBranch(partInSituation(part, at), 'mounted'), band, 1e-6));
    // A quarter of C: twice the frequency.
    expect(lowest?.[0]).toBeCloseTo(2 * 15_915_494, -2);
  });

  it('keeps its catalogue curves where the engine refuses the bias', () => {
    const curves = partCurves(part, { ...CATALOGUE, voltage_V: 11 });
    expect(curves.service).toEqual([]);
    expect(curves.serviceLowest).toBeNull();
    expect(curves.catalogueLowest?.[0]).toBeCloseTo(15_915_494, -1);
    expect(curves.band).toEqual(partCurves(part, CATALOGUE).band);
  });

  it('shows a measured table by its points', () => {
    const measured = partCurves(
      {
        ...part,
        impedance_table: [
          [1e6, 0.03, -1.6],
          [1e8, 0.04, 0.24],
        ],
      },
      CATALOGUE,
    ).measured;
    expect(measured).toEqual([
      [1e6, Math.hypot(0.03, -1.6)],
      [1e8, Math.hypot(0.04, 0.24)],
    ]);
  });
});
