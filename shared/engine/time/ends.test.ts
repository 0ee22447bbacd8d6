import { describe, expect, it } from 'vitest';
import type { LineModel, RailNetwork } from '../network';
import { compileRail, railImpedance, scratch } from '../rail';
import { directResistance, endAtInfinity } from './ends';
import { ladderOf } from './ladder';
import { lumpedRail } from './stand-in';

const line = (esr_ohm: number, capacitance_F: number, inductance_H: number): LineModel => ({
  id: 'c',
  count: 2,
  esr_ohm,
  capacitance_F,
  inductance_H,
});
const rl = { kind: 'rl' as const, resistance_ohm: 1e-3, inductance_H: 1e-8 };
const damped = {
  kind: 'damped' as const,
  series_resistance_ohm: 1e-3,
  series_inductance_H: 0,
  inductor_resistance_ohm: 2e-3,
  inductance_H: 1e-6,
  damping_ohm: 0.02,
  damping_inductance_H: 0,
};
const pack = { resistance_ohm: 3e-3, inductance_H: 2e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 2e-3 };
const rails: Record<string, RailNetwork> = {
  'inductance everywhere': { source: rl, lines: [line(0.02, 1e-6, 1e-9)], observe: 'pins' },
  'a resistance at high frequency': {
    source: rl,
    lines: [line(0.02, 1e-6, 0), line(0.01, 1e-5, 1e-9)],
    observe: 'pins',
  },
  'a damped source with a resistance at high frequency': {
    source: damped,
    lines: [line(0.01, 1e-5, 1e-9)],
    observe: 'pins',
  },
  'a capacitor without anything': { source: rl, lines: [line(0, 1e-6, 0)], observe: 'pins' },
  'a package without die': {
    source: rl,
    lines: [line(0.02, 1e-6, 0)],
    package: { ...pack, die_capacitance_F: 0 },
    observe: 'die',
  },
  'a die behind inductance': { source: rl, lines: [line(0.02, 1e-6, 0)], package: pack, observe: 'die' },
  'a die behind a resistance': {
    source: rl,
    lines: [line(0.02, 1e-6, 0)],
    package: { ...pack, inductance_H: 0 },
    observe: 'die',
  },
  'a die without resistance': {
    source: rl,
    lines: [],
    package: { ...pack, die_resistance_ohm: 0 },
    observe: 'die',
  },
};

describe('both ends of Z', () => {
  for (const [name, network] of Object.entries(rails)) {
    const rail = compileRail(network);
    const ladder = ladderOf(lumpedRail(rail).rail);
    const z = scratch();
    it(`with ${name}: s·L + R at very high frequency`, () => {
      const f = 1e15;
      railImpedance(rail, f, z);
      const { inductance_H, resistance_ohm } = endAtInfinity(ladder);
      expect(z[1] / (2 * Math.PI * f)).toBeCloseTo(inductance_H, 16);
      expect(z[0]).toBeCloseTo(resistance_ohm, 9);
    });
    it(`with ${name}: the direct resistance at very low frequency`, () => {
      railImpedance(rail, 1e-4, z);
      expect(z[0]).toBeCloseTo(directResistance(ladder), 9);
    });
  }

  it('is open for direct current without a source', () => {
    const rail = compileRail({ source: { kind: 'open' }, lines: [line(0.02, 1e-6, 0)], observe: 'pins' });
    expect(directResistance(ladderOf(rail))).toBe(Number.POSITIVE_INFINITY);
  });
});
