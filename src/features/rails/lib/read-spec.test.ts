import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import { type RailSpec, rippleLeft_percent } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { errorsAtFields } from './field-of-path';
import { formOf } from './form-of';
import { readSpec } from './read-spec';
import type { SpecErrors, SpecForm } from './spec-form';
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

function errorsOf(form: SpecForm, board = EMPTY_SETUP): SpecErrors {
  const answer = readSpec(form, board);
  if ('errors' in answer) return answer.errors;
  throw new Error('should be refused');
}

describe('reading the specification form', () => {
  it('reads what an engineer types', () => {
    const spec = specOf({
      ...filled,
      resistance: '0R5',
      inductance: '20n',
      hasPackage: true,
      packageInductance: '45p',
      dieCapacitance: '20nF',
      observe: 'die',
      hasStep: true,
      stepSize: '9',
      hasStartUp: true,
      softStart: '1m',
      currentLimit: '12',
    });
    expect(spec).toMatchObject({
      voltage_V: 0.9,
      target: { kind: 'step', ripple_percent: 3, step_A: 9 },
      source: { resistance_ohm: 0.5, inductance_H: 2e-8 },
      package: { inductance_H: 4.5e-11, die_capacitance_F: 2e-8 },
      observe: 'die',
      start_up: { soft_start_s: 1e-3, current_limit_A: 12 },
    });
    expect(specOf(formOf(spec))).toEqual(spec);
  });

  it('states the usual conditions of a new rail, and leaves them out when asked to', () => {
    expect(specOf(filled).conditions).toEqual({
      coldest_C: 0,
      usual_C: 45,
      hottest_C: 70,
      age_h: 87_660,
      vary: ['capacitance', 'esr', 'esl'],
    });
    expect(specOf({ ...filled, age: '5000 h', vary: [] }).conditions).toMatchObject({
      age_h: 5000,
      vary: [],
    });
    expect(specOf({ ...filled, conditionsKind: 'assumed', age: 'x' })).not.toHaveProperty('conditions');
  });

  it('takes as ripple what a budget leaves', () => {
    const form: SpecForm = {
      ...filled,
      voltage: '1.8',
      budgetKind: 'budget',
      tolerance: '5',
      setpoint: '1',
      dcDrop: '10m',
      regulatorRipple: '8m',
      ripple: 'hidden and not read',
    };
    const { target, noise_budget } = specOf(form);
    // 5 % − 1 % − (10 mV + 8 mV) ÷ 1.8 V = 3 %
    expect(target).toMatchObject({ kind: 'step', ripple_percent: expect.closeTo(3, 12) });
    expect(noise_budget).toEqual({
      tolerance_percent: 5,
      setpoint_percent: 1,
      dc_drop_V: 0.01,
      regulator_ripple_V: 0.008,
    });
    const flat = specOf({ ...form, targetKind: 'flat', impedance: '10m' });
    expect(flat.target).toEqual({ kind: 'flat', impedance_ohm: 0.01 });
    expect(flat.noise_budget && rippleLeft_percent(flat.noise_budget, flat.voltage_V)).toBeCloseTo(3, 12);
    expect(specOf({ ...form, setpoint: '', dcDrop: ' ', regulatorRipple: '' }).target).toMatchObject({
      ripple_percent: 5,
    });
  });

  it('refuses a budget that leaves nothing, at its tolerance', () => {
    const form: SpecForm = { ...filled, voltage: '1.8', budgetKind: 'budget', tolerance: '2', dcDrop: '45m' };
    expect(errorsOf(form)).toEqual({
      tolerance: 'nothing is left for the bank: overspent by 9\u00a0mV (0.5\u00a0%)',
    });
    expect(errorsOf({ ...form, dcDrop: '36m' })).toEqual({
      tolerance: 'nothing is left for the bank: the tolerance is spent',
    });
    expect(errorsOf({ ...form, targetKind: 'mask', mask: '10k 3m' })).toHaveProperty('tolerance');
    expect(errorsOf({ ...form, tolerance: '0' }).tolerance).toMatch(/above zero/);
    expect(Object.keys(errorsOf({ ...form, voltage: 'x' }))).toEqual(['voltage']);
    expect(specOf({ ...form, budgetKind: 'none' })).not.toHaveProperty('noise_budget');
  });

  it('takes spacing, permittivity and capacitance from the stack-up', () => {
    const form: SpecForm = {
      ...filled,
      planeKind: 'stackup',
      pairUpper: 'GND',
      pairLower: 'PWR',
      length: '100',
      width: '60',
      spacing: 'not read',
    };
    const { plane } = specOf(form, setup);
    expect(plane?.geometry).toMatchObject({
      spacing_m: 1e-4,
      relative_permittivity: expect.closeTo(4.2, 12),
      pair: ['GND', 'PWR'],
    });
    // ε₀ · 4.2 · 100 mm · 60 mm ÷ 0.1 mm, ε₀ = 8.854 pF/m
    expect((plane?.capacitance_F ?? 0) * 1e9).toBeCloseTo((8.854e-3 * 4.2 * 0.1 * 0.06) / 1e-4, 3);
    expect(errorsOf({ ...form, pairUpper: 'TOP' }, setup).pairUpper).toMatch(/TOP is a signal layer/);
    expect(errorsOf({ ...form, pairLower: 'L9' }, setup)).toEqual({
      pairUpper: 'the stack-up has no copper layer called L9',
    });
    expect(errorsOf({ ...form, pairUpper: '', pairLower: '' }, setup)).toEqual({
      pairUpper: 'choose two planes of the stack-up',
    });
    expect(Object.keys(errorsOf(form))).toEqual(['pairUpper']);
  });
});

describe('faults of the specification form', () => {
  it('stand each at its field, all of them', () => {
    expect(errorsOf({ ...filled, name: '', voltage: 'abc' }).voltage).toMatch(/abc/);
    expect(errorsOf({ ...filled, name: '', bandLow: '50M', bandHigh: '10M' })).toMatchObject({
      name: expect.any(String),
      bandHigh: expect.stringContaining('above its start'),
    });
    expect(Object.keys(errorsOf({ ...filled, length: '-5' }))).toEqual(['length']);
    expect(errorsOf({ ...filled, riseKind: 'time', targetRise: '0' })).toEqual({
      targetRise: 'rise time must be above zero',
    });
    expect(errorsOf({ ...filled, riseKind: 'inductance' })).toEqual({ targetInductance: 'type a number' });
    expect(errorsOf({ ...filled, hasStartUp: true, softStart: '-1m', currentLimit: '' })).toEqual({
      softStart: 'soft start must be above zero',
      currentLimit: 'type a number',
    });
    expect(errorsOf({ ...filled, coldest: '50', hottest: '40' })).toEqual({
      usual: 'must not lie below the coldest',
      hottest: 'must not lie below the usual',
    });
    expect(errorsOf({ ...filled, coldest: '5 F', age: '-1' })).toEqual({
      coldest: expect.stringContaining('not understood'),
      age: 'age must not be negative',
    });
  });

  it('go to the field that stands for a hidden one', () => {
    const damped: SpecForm = {
      ...filled,
      sourceKind: 'damped',
      inductorInductance: '-220n',
      dampingResistance: '5m',
    };
    expect(errorsOf(damped)).toEqual({ inductorInductance: expect.stringContaining('negative') });
    expect(errorsOf({ ...filled, bandKind: 'derived', bandwidth: '-1' })).toEqual({
      bandwidth: expect.stringContaining('above zero'),
    });
  });

  it('name the line of a list that they stand on', () => {
    const table: SpecForm = { ...filled, sourceKind: 'table' };
    expect(errorsOf({ ...table, sourceTable: '# f Re Im\n1k 1m 1m\n\n1k 2m 2m' })).toEqual({
      sourceTable: 'line 4: frequencies must rise from point to point',
    });
    expect(errorsOf({ ...table, sourceTable: '1k 1m 1m\n2k -1m 2m' }).sourceTable).toMatch(
      /^line 2: .*negative/,
    );
    expect(errorsOf({ ...table, sourceTable: '1k 1m 1m\n# here\n2k 0 0' })).toEqual({
      sourceTable: 'line 3: the impedance is zero',
    });
    expect(errorsOf({ ...table, sourceTable: '1k 1m' }).sourceTable).toMatch(/^line 1: 3 numbers/);
    expect(errorsOf({ ...filled, targetKind: 'mask', mask: '10k 3m\n5k 4m' })).toEqual({
      mask: 'line 2: frequencies must rise from point to point',
    });
  });

  it('of fields that are not shown never block', () => {
    const hidden: SpecForm = {
      ...filled,
      impedance: 'x',
      mask: 'x',
      targetRise: 'x',
      targetInductance: 'x',
      tolerance: 'x',
      setpoint: 'x',
      dcDrop: 'x',
      regulatorRipple: 'x',
      rise: 'x',
      bandwidth: 'x',
      seriesResistance: 'x',
      inductorInductance: 'x',
      sourceTable: 'x',
      planeKind: 'none',
      pairUpper: 'gone',
      length: 'x',
      planeCapacitance: 'x',
      planeResistance: 'x',
      packageInductance: 'x',
      stepSize: 'x',
      stepEnd: 'x',
      softStart: 'x',
      conditionsKind: 'assumed',
      coldest: 'x',
      age: 'x',
    };
    expect(specOf(hidden)).toMatchObject({ name: 'VDD_CORE', target: { ripple_percent: 3 } });
  });

  it('of the server find their fields too', () => {
    expect(
      errorsAtFields([
        { path: 'name', message: 'taken' },
        { path: 'plane.geometry.pair', message: 'gone' },
        { path: 'noise_budget.tolerance_percent', message: 'spent' },
        { path: 'conditions.hottest_C', message: 'low' },
        { path: 'start_up.current_limit_A', message: 'none' },
        { path: 'elsewhere', message: 'what' },
      ]),
    ).toEqual({
      name: 'taken',
      pairUpper: 'gone',
      tolerance: 'spent',
      hottest: 'low',
      currentLimit: 'none',
      form: 'what',
    });
  });
});
