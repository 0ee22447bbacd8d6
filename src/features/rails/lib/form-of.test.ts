import { planeCapacitance } from '@shared/engine/plane';
import { type BoardSetup, EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import { type RailSpec, rippleLeft_percent } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { formOf } from './form-of';
import { readSpec } from './read-spec';
import type { SpecForm } from './spec-form';
import { EMPTY_SPEC } from './spec-form-values';

const filled: SpecForm = { ...EMPTY_SPEC, name: 'VDD_CORE', voltage: '0.9', ripple: '3', step: '9' };

const setup: BoardSetup = {
  recipes: [],
  stackup: {
    layers: [
      { kind: 'copper', name: 'TOP', thickness_m: 35e-6, use: 'signal' },
      { kind: 'dielectric', name: 'a', thickness_m: 1e-4, relative_permittivity: 4 },
      { kind: 'copper', name: 'GND', thickness_m: 35e-6, use: 'plane' },
      { kind: 'dielectric', name: 'b', thickness_m: 1e-4, relative_permittivity: 4.2 },
      { kind: 'copper', name: 'PWR', thickness_m: 35e-6, use: 'plane' },
    ],
  },
};

function specOf(form: SpecForm, board = EMPTY_SETUP): RailSpec {
  const answer = readSpec(form, board);
  if ('spec' in answer) return answer.spec;
  throw new Error(JSON.stringify(answer.errors));
}

describe('a stored specification', () => {
  const base = { name: 'V', voltage_V: 3.3, observe: 'pins' } as const;
  const budget = { tolerance_percent: 5, setpoint_percent: 0.7, dc_drop_V: 0.0123, regulator_ripple_V: 3e-7 };
  const specs: Record<string, RailSpec> = {
    'a mask, a damped source, a budget for what happens in time': {
      ...base,
      band_Hz: [1e4, 1e8],
      target: {
        kind: 'mask',
        points: [
          [1e4, 0.01],
          [1e8, 0.1],
        ],
      },
      noise_budget: budget,
      source: {
        kind: 'damped',
        series_resistance_ohm: 1e-3,
        series_inductance_H: 0,
        inductor_resistance_ohm: 2e-3,
        inductance_H: 4.7e-7,
        damping_ohm: 0.02,
        damping_inductance_H: 1e-8,
      },
    },
    'a flat target rising with an inductance, a table, planes as values': {
      ...base,
      band_Hz: [1e4, 1e8],
      target: { kind: 'flat', impedance_ohm: 0.0123, rising_H: 4.56e-11 },
      source: {
        kind: 'table',
        points: [
          [1e3, 0.001, 0.002],
          [1e5, 0.002, -0.02],
        ],
      },
      plane: { capacitance_F: 2.345e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
    },
    'ripple from a budget, rising after a rise time, planes from the stack-up, all that happens in time': {
      ...base,
      band_Hz: [5e4, 0.35 / 1.3e-8],
      band_basis: { rise_s: 1.3e-8, knee: 0.35, regulator_bandwidth_Hz: 5e4 },
      target: {
        kind: 'step',
        ripple_percent: rippleLeft_percent(budget, 3.3),
        step_A: 7.7,
        rise_s: 1.3e-8,
      },
      noise_budget: budget,
      source: { kind: 'open' },
      plane: specOf(
        { ...filled, planeKind: 'stackup', pairUpper: 'GND', pairLower: 'PWR', length: '33.3', width: '1in' },
        setup,
      ).plane,
      package: { resistance_ohm: 0, inductance_H: 6e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 0.01 },
      observe: 'die',
      load_step: { before_A: 1, step_A: 7.7, rise_s: 1.3e-8, hold_s: 5e-5, fall_s: 2e-8, end_s: 1.7e-4 },
      start_up: { soft_start_s: 2.5e-3, current_limit_A: 11.5 },
      conditions: {
        coldest_C: -40,
        usual_C: 25.5,
        hottest_C: 105,
        age_h: 12_345,
        vary: ['esl', 'capacitance'],
      },
    },
    'the upper knee, lengths that no round number of millimetres gives, an age in years': {
      ...base,
      band_Hz: [5e4, 0.5 / 1e-8],
      band_basis: { rise_s: 1e-8, knee: 0.5, regulator_bandwidth_Hz: 5e4 },
      target: { kind: 'step', ripple_percent: 2.5e-4, step_A: 7 },
      source: { kind: 'rl', resistance_ohm: 0, inductance_H: 1e-8 },
      plane: {
        capacitance_F: planeCapacitance(0.1 / 3, 0.1, 1.27e-4, 3.66),
        resistance_ohm: 0,
        inductance_H: 0,
        geometry: {
          length_m: 0.1 / 3,
          width_m: 0.1,
          spacing_m: 1.27e-4,
          relative_permittivity: 3.66,
          via_radius_m: 1.5e-4,
          load_radius_m: 0.7 / 300,
        },
      },
      conditions: { coldest_C: 20, usual_C: 20, hottest_C: 20, age_h: 5 * 8766, vary: [] },
    },
  };
  it.each(Object.entries(specs))('comes back from the form as it was: %s', (_, spec) => {
    expect(specOf(formOf(spec), setup)).toEqual(spec);
  });

  it('keeps nothing of the defaults where it says nothing', () => {
    const bare = specs['a mask, a damped source, a budget for what happens in time'];
    const form = formOf(bare);
    expect(form).toMatchObject({
      planeKind: 'none',
      conditionsKind: 'assumed',
      hasStep: false,
      hasPackage: false,
      hasStartUp: false,
      riseKind: 'level',
    });
    expect(Object.keys(specOf(form)).sort()).toEqual(Object.keys(bare).sort());
  });
});
