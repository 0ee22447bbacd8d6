import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import {
  bandSentence,
  errorsAtFields,
  planeSentence,
  readPoints,
  readSpec,
  targetSentence,
} from './spec-form';
import { EMPTY_SPEC, formOf } from './spec-form-values';

const filled = { ...EMPTY_SPEC, name: 'VDD_CORE', voltage: '0.9', ripple: '3', step: '9' };

describe('the specification form', () => {
  it('says what the target, the band and the planes come to while one types', () => {
    expect(targetSentence(filled)).toBe('3\u00a0% of 0.9\u00a0V at 9\u00a0A → 3.00\u00a0mΩ');
    expect(bandSentence({ ...filled, bandKind: 'derived', rise: '10n', bandwidth: '50k' })).toContain(
      '35.0\u00a0MHz',
    );
    // 271 pF for 100 × 100 mm at 1.6 mm and εr 4.9: course page on plane pairs, in published-checks as pl-100mm.
    const pair = { ...filled, length: '100', width: '100', spacing: '1.6', permittivity: '4.9' };
    expect(planeSentence(pair)).toContain('271\u00a0pF');
    expect(targetSentence({ ...filled, step: 'x' })).toBe('');
  });

  it('reads what an engineer types and writes it back the same', () => {
    const answer = readSpec({
      ...filled,
      resistance: '0R5',
      inductance: '20n',
      hasPackage: true,
      packageInductance: '45p',
      dieCapacitance: '20nF',
      observe: 'die',
      hasStep: true,
      stepSize: '9',
    });
    if (!('spec' in answer)) throw new Error(JSON.stringify(answer));
    expect(answer.spec).toMatchObject({
      voltage_V: 0.9,
      target: { kind: 'step', ripple_percent: 3, step_A: 9 },
      source: { resistance_ohm: 0.5, inductance_H: 2e-8 },
      package: { inductance_H: 4.5e-11, die_capacitance_F: 2e-8 },
      observe: 'die',
    });
    expect(readSpec(formOf(answer.spec))).toEqual(answer);
  });

  it('puts each fault at its field and keeps all of them', () => {
    const answer = readSpec({ ...filled, name: '', voltage: 'abc', bandLow: '50M', bandHigh: '10M' });
    if (!('errors' in answer)) throw new Error('should be refused');
    expect(answer.errors.voltage).toMatch(/abc/);
    const later = readSpec({ ...filled, name: '', bandLow: '50M', bandHigh: '10M' });
    expect('errors' in later && later.errors).toMatchObject({
      name: expect.any(String),
      bandHigh: expect.stringContaining('above its start'),
    });
    const damped = {
      ...filled,
      sourceKind: 'damped' as const,
      inductorInductance: '-220n',
      dampingResistance: '5m',
    };
    expect(readSpec(damped)).toMatchObject({
      errors: { inductorInductance: expect.stringContaining('negative') },
    });
    const planes = readSpec({ ...filled, length: '-5' });
    expect('errors' in planes && Object.keys(planes.errors)).toEqual(['length']);
    expect(errorsAtFields([{ path: 'name', message: 'taken' }])).toEqual({ name: 'taken' });
  });

  it('reads tables line by line and says which line is wrong', () => {
    expect(readPoints('10k 3m\n1M;10m\n# note\n', ['Hz', 'Ω'])).toEqual({
      ok: true,
      rows: [
        [1e4, 3e-3],
        [1e6, 1e-2],
      ],
    });
    expect(readPoints('1M, 10m', ['Hz', 'Ω'])).toEqual({ ok: true, rows: [[1e6, 1e-2]] });
    expect(readPoints('1e6,0.01,0.02', ['Hz', 'Ω', 'Ω'])).toEqual({ ok: true, rows: [[1e6, 0.01, 0.02]] });
    expect(readPoints('', ['Hz', 'Ω', 'Ω'])).toMatchObject({ reason: expect.stringContaining('10k 3m 5m') });
    expect(readPoints('10k 3m\n1M', ['Hz', 'Ω'])).toMatchObject({
      ok: false,
      reason: expect.stringContaining('line 2'),
    });
  });

  it('round-trips every kind of specification', () => {
    const base = { name: 'V', voltage_V: 3.3, band_Hz: [1e4, 1e8], observe: 'pins' } as const;
    const specs: RailSpec[] = [
      {
        ...base,
        band_Hz: [1e4, 1e8],
        target: {
          kind: 'mask',
          points: [
            [1e4, 0.01],
            [1e8, 0.1],
          ],
        },
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
      {
        ...base,
        band_Hz: [1e4, 1e8],
        target: { kind: 'flat', impedance_ohm: 0.0123 },
        source: {
          kind: 'table',
          points: [
            [1e3, 0.001, 0.002],
            [1e5, 0.002, -0.02],
          ],
        },
        plane: { capacitance_F: 2.345e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
      },
    ];
    for (const spec of specs) expect(readSpec(formOf(spec))).toEqual({ spec });
  });
});
