import { EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import { describe, expect, it } from 'vitest';
import { sentencesOf } from './sentences';
import type { SpecForm } from './spec-form';
import { EMPTY_SPEC } from './spec-form-values';

const filled: SpecForm = { ...EMPTY_SPEC, name: 'VDD_CORE', voltage: '0.9', ripple: '3', step: '9' };
const said = (form: Partial<SpecForm>, setup = EMPTY_SETUP) => {
  const sentences = sentencesOf({ ...filled, ...form }, setup);
  return (of: keyof typeof sentences) => sentences[of].replaceAll('\u00a0', ' ');
};

describe('what the target comes to', () => {
  it('while one types, and nothing until it can be said', () => {
    expect(said({})('target')).toBe('3 % of 0.9 V at 9 A → 3.00 mΩ');
    expect(said({ step: 'x' })('target')).toBe('');
    expect(said({ voltage: '' })('target')).toBe('');
    expect(said({ targetKind: 'flat', impedance: '10m' })('target')).toBe('');
  });

  it('from a budget is what that leaves', () => {
    const budget = { budgetKind: 'budget', tolerance: '5', setpoint: '1', regulatorRipple: '9m' } as const;
    expect(said(budget)('target')).toBe('3 % of 0.9 V at 9 A → 3.00 mΩ');
    expect(said({ ...budget, dcDrop: '27m' })('target')).toBe('');
    expect(said(budget)('budget')).toBe('');
    const flat = { ...budget, targetKind: 'flat', impedance: '10m' } as const;
    expect(said(flat)('budget')).toBe('the rail may move by 27 mV (3 %) under its load');
    expect(said({ ...flat, dcDrop: '27m' })('budget')).toBe('');
    expect(said({ ...flat, budgetKind: 'none' })('budget')).toBe('');
  });

  it('says from where it rises, and where the band makes that pointless', () => {
    const flat = { targetKind: 'flat', impedance: '8.5m', riseKind: 'time', bandHigh: '100M' } as const;
    // 1 ÷ (π · 10 ns) = 31.8 MHz
    expect(said({ ...flat, targetRise: '10n' })('target')).toBe(
      '8.50 mΩ up to 31.8 MHz, then 20 dB a decade',
    );
    expect(said({ ...flat, targetRise: '10n', bandHigh: '30M' })('target')).toMatch(/level all over it$/);
    // 8.5 mΩ ÷ (2π · 100 pH) = 13.5 MHz
    const coil = { ...flat, riseKind: 'inductance', targetInductance: '100p' } as const;
    expect(said(coil)('target')).toBe('8.50 mΩ up to 13.5 MHz, then 20 dB a decade');
    expect(said({ ...coil, targetInductance: '1u' })('target')).toMatch(/it rises over the whole band$/);
    expect(said({ riseKind: 'time', bandHigh: '100M' })('target')).toBe(
      '3 % of 0.9 V at 9 A → 3.00 mΩ up to 31.8 MHz, then 20 dB a decade',
    );
  });

  it('says of a mask narrower than the band that it goes on level', () => {
    const mask = { targetKind: 'mask', mask: '100k 3m\n10M 20m' } as const;
    expect(said({ ...mask, bandLow: '100k', bandHigh: '10M' })('target')).toBe('2 points, 100 kHz to 10 MHz');
    expect(said({ ...mask, bandLow: '1M', bandHigh: '30M' })('target')).toBe(
      '2 points, 100 kHz to 10 MHz; narrower than the band, it goes on level above 10 MHz at 20.0 mΩ',
    );
    expect(said(mask)('target')).toMatch(/level below 100 kHz at 3.00 mΩ and above 10 MHz at 20.0 mΩ$/);
    expect(said({ ...mask, mask: '10k 3m' })('target')).toBe('1 point: level at 3.00 mΩ over the whole band');
    expect(said({ ...mask, mask: '10k' })('target')).toBe('');
  });
});

describe('what band and planes come to', () => {
  it('from rise time and dimensions', () => {
    expect(said({ bandKind: 'derived', rise: '10n', bandwidth: '50k' })('band')).toContain('35.0 MHz');
    // 271 pF for 100 × 100 mm at 1.6 mm and εr 4.9: course page on plane pairs, in published-checks as pl-100mm.
    const pair = { length: '100', width: '100', spacing: '1.6', permittivity: '4.9' };
    expect(said(pair)('planes')).toContain('271 pF');
    expect(said({ ...pair, spacing: '0' })('planes')).toBe('');
  });

  it('from two layers of the stack-up, the dielectrics between them in series', () => {
    const setup = {
      recipes: [],
      stackup: {
        layers: [
          { kind: 'copper', name: 'GND', thickness_m: 35e-6, use: 'plane' },
          { kind: 'dielectric', name: 'core', thickness_m: 1e-3, relative_permittivity: 5 },
          { kind: 'dielectric', name: 'glue', thickness_m: 0.6e-3, relative_permittivity: 4.7382 },
          { kind: 'copper', name: 'PWR', thickness_m: 35e-6, use: 'plane' },
        ],
      },
    } as const satisfies typeof EMPTY_SETUP;
    const form = {
      planeKind: 'stackup',
      pairUpper: 'GND',
      pairLower: 'PWR',
      length: '100',
      width: '100',
    } as const;
    // 1.6 mm of εr 4.9 in all: 271 pF as above.
    expect(said(form, setup)('planes')).toMatch(
      /^GND and PWR lie 1.6 mm apart, εr 4.9 → 271 pF; first cavity/,
    );
    expect(said({ ...form, pairLower: 'L9' }, setup)('planes')).toBe('');
    expect(said(form)('planes')).toBe('');
  });
});

describe('what package and die come to', () => {
  const pack = { hasPackage: true, packageInductance: '60p', observe: 'die', bandHigh: '40M' } as const;
  it('says up to where a bank on the board helps', () => {
    // 9 mΩ ÷ (2π · 60 pH) = 23.9 MHz
    expect(said({ ...pack, targetKind: 'flat', impedance: '9m' })('package')).toBe(
      'package 60 pH: above 23.9 MHz its own 2πf·L exceeds the target; no bank on the board reaches the die beyond',
    );
    expect(said({ ...pack, targetKind: 'flat', impedance: '90m' })('package')).toBe(
      'package 60 pH: its own 2πf·L stays below the target over the whole band',
    );
    expect(said({ ...pack, packageInductance: '1u' })('package')).toMatch(/over the whole band; no bank/);
  });

  it('nothing while package, target or band are not known', () => {
    expect(said({ ...pack, hasPackage: false })('package')).toBe('');
    expect(said({ ...pack, packageInductance: '' })('package')).toBe('');
    expect(said({ ...pack, step: '' })('package')).toBe('');
    expect(said({ ...pack, bandLow: '50M' })('package')).toBe('');
  });
});

describe('what start-up and conditions come to', () => {
  it('says how large a bank the limit can charge', () => {
    // 5 A · 1 ms ÷ 1.8 V = 2.78 mF
    const start = { hasStartUp: true, voltage: '1.8', softStart: '1m', currentLimit: '5' };
    expect(said(start)('startUp')).toBe('5 A for 1 ms charge at most 2.78 mF to 1.8 V');
    expect(said({ ...start, currentLimit: '0' })('startUp')).toBe('');
    expect(said({ ...start, hasStartUp: false })('startUp')).toBe('');
  });

  it('counts the corners of what is stated, and shows what is assumed', () => {
    expect(said({})('conditions')).toBe(
      '32 corners: cold or hot; new or aged; C, ESR and ESL each at either end of their tolerances',
    );
    expect(said({ vary: ['capacitance'], age: '500 h' })('conditions')).toBe(
      '4 corners: cold or hot; C at either end of its tolerance',
    );
    const still = { coldest: '20', usual: '20', hottest: '20 °C', age: '0', vary: [] };
    expect(said(still)('conditions')).toBe('1 corner: nothing varies');
    expect(said({ hottest: '10' })('conditions')).toBe('');
    expect(said({ conditionsKind: 'assumed' })('conditions')).toBe(
      'assumed: 0 °C to 70 °C, usually 45 °C; 10 years; tolerances of C, ESR and ESL → 32 corners: cold or hot; new or aged; C, ESR and ESL each at either end of their tolerances',
    );
  });
});
