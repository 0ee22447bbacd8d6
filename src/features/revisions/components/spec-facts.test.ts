import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { specFacts } from './spec-facts';

const spec: RailSpec = {
  name: 'VDD_CORE',
  voltage_V: 0.9,
  target: { kind: 'step', ripple_percent: 3, step_A: 9 },
  band_Hz: [1e4, 4e7],
  source: { kind: 'rl', resistance_ohm: 0.0012, inductance_H: 30e-9 },
  observe: 'pins',
};
const value = (rows: [string, string][], label: string) =>
  rows.find(([name]) => name === label)?.[1].replace(/\u00a0/g, ' ');

describe('specFacts', () => {
  it('states what a step target comes to', () => {
    const rows = specFacts(spec);
    expect(value(rows, 'target')).toBe('3.00 mΩ');
    expect(value(rows, 'band')).toBe('10 kHz – 40 MHz');
    expect(value(rows, 'source')).toBe('1.2 mΩ + 30 nH');
    expect(value(rows, 'plane')).toBe('not described');
  });

  it('writes a damped source as the network it is', () => {
    const rows = specFacts({
      ...spec,
      source: {
        kind: 'damped',
        series_resistance_ohm: 0.001,
        series_inductance_H: 0,
        inductor_resistance_ohm: 0,
        inductance_H: 1e-7,
        damping_ohm: 0.02,
        damping_inductance_H: 0,
      },
    });
    expect(value(rows, 'source')).toBe('1 mΩ + ((100 nH) ∥ (20 mΩ))');
  });
});
