import { describe, expect, it } from 'vitest';
import { makersAt } from './makers';
import type { RailNetwork } from './network';
import { findPeaks } from './peaks';
import { compileRail } from './rail';

const board: RailNetwork = {
  source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 2e-8 },
  plane: { capacitance_F: 8e-10, resistance_ohm: 1e-3, inductance_H: 1e-11 },
  lines: [
    { id: 'bulk', count: 2, esr_ohm: 6e-3, capacitance_F: 4.7e-4, inductance_H: 2.5e-9 },
    { id: 'small', count: 4, esr_ohm: 0.01, capacitance_F: 4.7e-7, inductance_H: 8e-10 },
  ],
  observe: 'pins',
};

describe('who makes a peak', () => {
  it('are the two lines whose anti-resonance it is', () => {
    const peaks = findPeaks(compileRail(board), 1e5, 1e7).filter((peak) => peak.edge === null);
    expect(peaks.some((peak) => peak.inductive === 'bulk' && peak.capacitive === 'small')).toBe(true);
  });

  it('is one line alone where |Z| only rises, however the planes look', () => {
    expect(makersAt(compileRail(board), 2e7)).toEqual({ inductive: 'small', capacitive: null });
  });

  it('is the die against package and board when looked at from the die', () => {
    const fromDie = compileRail({
      ...board,
      package: {
        resistance_ohm: 5e-4,
        inductance_H: 2e-10,
        die_capacitance_F: 4e-8,
        die_resistance_ohm: 3e-3,
      },
      observe: 'die',
    });
    const [peak] = findPeaks(fromDie, 1e7, 3e8).filter((one) => one.edge === null);
    expect(peak).toMatchObject({ inductive: 'package', capacitive: 'die' });
  });
});
