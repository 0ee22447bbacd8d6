import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { specFacts } from './spec-facts';

const stepTarget = { kind: 'step', ripple_percent: 3, step_A: 9 } as const;
const spec: RailSpec = {
  name: 'VDD_CORE',
  voltage_V: 0.9,
  target: stepTarget,
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

  it('says from where a target rises and why', () => {
    // 1 ÷ (π · 10 ns) = 31.8 MHz; 9 mΩ ÷ (2π · 100 pH) = 14.3 MHz
    const rising = specFacts({ ...spec, target: { ...stepTarget, rise_s: 1e-8 } });
    expect(value(rising, 'target')).toBe('3.00 mΩ up to 31.8 MHz, then 20 dB a decade (rise time 10 ns)');
    const coil = specFacts({ ...spec, target: { kind: 'flat', impedance_ohm: 9e-3, rising_H: 1e-10 } });
    expect(value(coil, 'target')).toBe('9.00 mΩ up to 14.3 MHz, then 20 dB a decade (as 100 pH)');
  });

  it('adds up the noise budget, what is zero left out', () => {
    const budget = { tolerance_percent: 5, setpoint_percent: 1, dc_drop_V: 0, regulator_ripple_V: 0.009 };
    expect(value(specFacts({ ...spec, noise_budget: budget }), 'budget')).toBe(
      '±5 % − 1 % set-point error − 9 mV regulator ripple → 3 % for the bank',
    );
    expect(value(specFacts(spec), 'budget')).toBeUndefined();
  });

  it('names conditions, and says so where they were assumed', () => {
    expect(value(specFacts(spec), 'conditions')).toBe(
      '0 °C to 70 °C, usually 45 °C; 10 years; C, ESR, ESL at their ends (assumed)',
    );
    const stated = { coldest_C: -40, usual_C: 25, hottest_C: 105, age_h: 2000, vary: [] };
    expect(value(specFacts({ ...spec, conditions: stated }), 'conditions')).toBe(
      '−40 °C to 105 °C, usually 25 °C; 2000 h; no tolerance at its ends',
    );
  });

  it('names start-up and the layers that the planes are', () => {
    const rows = specFacts({
      ...spec,
      start_up: { soft_start_s: 1e-3, current_limit_A: 12 },
      plane: {
        capacitance_F: 2.2e-9,
        resistance_ohm: 0,
        inductance_H: 0,
        geometry: {
          length_m: 0.1,
          width_m: 0.06,
          spacing_m: 1e-4,
          relative_permittivity: 4.2,
          via_radius_m: 1.5e-4,
          load_radius_m: 1.5e-3,
          pair: ['L2 GND', 'L3 PWR'],
        },
      },
    });
    expect(value(rows, 'start-up')).toBe('1 ms soft start, limit 12 A');
    expect(value(rows, 'plane')).toBe('2.2 nF, 100 mm × 60 mm, 0.1 mm apart, layers L2 GND and L3 PWR');
    expect(value(specFacts(spec), 'start-up')).toBeUndefined();
  });
});
