import { describe, expect, it } from 'vitest';
import type { RailNetwork } from './network';
import { boardShorted, packageReach_Hz } from './package-reach';
import { compileRail, impedanceMagnitude } from './rail';
import { flatTarget, maskTarget, risingTarget } from './target';

describe('what the board cannot reach', () => {
  it('begins where 2πf·L meets the target', () => {
    // 10 mΩ over 50 pH: 10e-3/(2π·50e-12) = 31.83 MHz
    const reach = packageReach_Hz({ inductance_H: 50e-12 }, [1e4, 1e9], flatTarget(0.01));
    expect(reach).toBeCloseTo(0.01 / (2 * Math.PI * 50e-12), 0);
    expect(packageReach_Hz({ inductance_H: 50e-12 }, [1e4, 3e7], flatTarget(0.01))).toBeNull();
    expect(packageReach_Hz({ inductance_H: 50e-12 }, [4e7, 1e9], flatTarget(0.01))).toBe(4e7);
    expect(packageReach_Hz({ inductance_H: 0 }, [1e4, 1e9], flatTarget(0.01))).toBeNull();
  });

  it('follows a target that rises', () => {
    // Rising from 10 MHz as 2πf·159 pH: a package of 100 pH never lies above it, one of 200 pH does from 7.96 MHz on.
    const target = risingTarget(0.01, 1e7);
    expect(packageReach_Hz({ inductance_H: 100e-12 }, [1e4, 1e9], target)).toBeNull();
    expect(packageReach_Hz({ inductance_H: 200e-12 }, [1e4, 1e9], target)).toBeCloseTo(
      0.01 / (2 * Math.PI * 200e-12),
      0,
    );
    const mask = maskTarget([
      [1e4, 0.1],
      [1e7, 0.001],
    ]);
    const f = packageReach_Hz({ inductance_H: 100e-12 }, [1e4, 1e9], mask) ?? 0;
    expect(2 * Math.PI * f * 100e-12).toBeCloseTo(0.1 * (f / 1e4) ** (-2 / 3), 9);
  });

  it('is approached by a bank without end', () => {
    const network: RailNetwork = {
      source: { kind: 'rl', resistance_ohm: 1e-12, inductance_H: 0 },
      lines: [],
      package: {
        resistance_ohm: 1e-3,
        inductance_H: 3e-11,
        die_capacitance_F: 2e-8,
        die_resistance_ohm: 3e-3,
      },
      observe: 'die',
    };
    const rail = compileRail(network);
    const f = Float64Array.from([1e5, 1e7, 2e8, 1e9]);
    boardShorted(rail, f)?.forEach((z, i) => {
      expect(z / impedanceMagnitude(rail, f[i])).toBeCloseTo(1, 6);
    });
    expect(boardShorted(compileRail({ ...network, observe: 'pins' }), f)).toBeNull();
  });
});
