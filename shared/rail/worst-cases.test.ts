import { describe, expect, it } from 'vitest';
import { tightestHeadroom } from '../engine/headroom';
import { compileRail, impedanceMagnitude } from '../engine/rail';
import { type RailDocument, railDocumentSchema } from '../schemas/rail-document.schema';
import { ASSUMED_CONDITIONS, conditionsOf } from './conditions';
import { cornerName, cornersOf, IN_SERVICE } from './corner';
import { documentIn, partIn } from './in-service';
import { networkOf } from './network';
import { targetMask } from './target-mask';
import { cornerResults, envelopeOver, headroomOf, missingParts } from './worst-cases';

const document: RailDocument = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1.2,
    target: { kind: 'flat', impedance_ohm: 0.01 },
    band_Hz: [1e4, 3e7],
    source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
    plane: { capacitance_F: 2e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 },
    conditions: {
      coldest_C: -40,
      usual_C: 60,
      hottest_C: 85,
      age_h: 87_660,
      vary: ['capacitance', 'esr', 'esl'],
    },
  },
  parts: [
    {
      id: 'bulk',
      capacitance_F: 4.7e-4,
      esr_ohm: 6e-3,
      esl_H: 1.6e-9,
      mount_H: 9e-10,
      technology: 'polymer',
      tolerance: 'M',
      rated_voltage_V: 2.5,
      esr_tolerance_percent: 25,
      esl_tolerance_percent: 10,
    },
    {
      id: 'mid',
      capacitance_F: 2.2e-5,
      esr_ohm: 3e-3,
      esl_H: 4e-10,
      mount_H: 6e-10,
      technology: 'ceramic',
      dielectric: 'X6S',
      case: '0603',
      tolerance: 'M',
      rated_voltage_V: 4,
      bias_curve: [
        [0, 1],
        [1.2, 0.8],
        [4, 0.3],
      ],
      temperature_curve: [
        [-55, 0.9],
        [25, 1],
        [105, 0.8],
      ],
      ageing_percent_per_decade: 2.5,
    },
    { id: 'bare', capacitance_F: 1e-7, esr_ohm: 2e-2, esl_H: 3e-10, mount_H: 4e-10 },
  ],
  bank: [
    { part: 'bulk', count: 3 },
    { part: 'mid', count: 6 },
    { part: 'bare', count: 10 },
  ],
});

describe('corners of a rail’s conditions', () => {
  it('are 2ᵏ for the k that vary, each once', () => {
    const all = cornersOf(ASSUMED_CONDITIONS);
    expect(all.length).toBe(32);
    expect(new Set(all.map(cornerName)).size).toBe(32);
    expect(cornersOf({ ...ASSUMED_CONDITIONS, vary: ['esr'] }).length).toBe(8);
    expect(cornersOf({ ...ASSUMED_CONDITIONS, vary: [], age_h: 500 }).length).toBe(2);
    const still = cornersOf({ coldest_C: 25, usual_C: 25, hottest_C: 25, age_h: 0, vary: [] });
    expect(still).toEqual([
      { temperature: 'usual', age: 'fresh', capacitance: 'nominal', esr: 'nominal', esl: 'nominal' },
    ]);
    expect(cornerName(all[0])).toBe('cold, fresh, C low, ESR low, ESL low');
  });

  it('are assumed where a rail states none, and said to be', () => {
    expect(conditionsOf({})).toEqual({ conditions: ASSUMED_CONDITIONS, assumed: true });
    expect(conditionsOf(document.rail).assumed).toBe(false);
  });
});

describe('parts in service', () => {
  it('multiply catalogue by what bias, temperature, age and tolerance leave', () => {
    const aged = 1 - 0.025 * Math.log10(87.66);
    const at60 = partIn(document.parts[1], document.rail, IN_SERVICE).capacitance_F / 2.2e-5 / 0.8 / aged;
    expect(at60).toBeGreaterThan(0.8);
    expect(at60).toBeLessThan(1);
    const cold = partIn(document.parts[1], document.rail, {
      ...IN_SERVICE,
      temperature: 'cold',
      capacitance: 'low',
    });
    const hot = partIn(document.parts[1], document.rail, {
      ...IN_SERVICE,
      temperature: 'hot',
      capacitance: 'low',
    });
    expect(cold.capacitance_F).toBeGreaterThan(hot.capacitance_F);
    expect(hot.capacitance_F).toBeLessThan(2.2e-5 * 0.8 * 0.8 * 0.9 * aged);
  });

  it('leave a bare part as it stands, and say which part is beyond its rating', () => {
    expect(partIn(document.parts[2], document.rail, IN_SERVICE).capacitance_F).toBe(1e-7);
    const over = { ...document, rail: { ...document.rail, voltage_V: 3 } };
    expect(() => documentIn(over, IN_SERVICE)).toThrow(
      expect.objectContaining({
        field: 'parts[0].rated_voltage_V',
        message: expect.stringContaining('bulk'),
      }),
    );
  });

  it('shift a measured table by what the capacitance has changed', () => {
    const R = 3e-3;
    const L = 4e-10;
    const C = 2.2e-5;
    const impedance_table = Array.from({ length: 400 }, (_, i): [number, number, number] => {
      const f = 1e3 * 1e6 ** (i / 399);
      const w = 2 * Math.PI * f;
      return [f, R, w * L - 1 / (w * C)];
    });
    const tabled = {
      ...document,
      parts: document.parts.map((p) => (p.id === 'mid' ? { ...p, impedance_table } : p)),
    };
    const plain = compileRail(networkOf(documentIn(document, IN_SERVICE)));
    const table = compileRail(networkOf(documentIn(tabled, IN_SERVICE)));
    for (const f of [1e4, 1e5, 4e5, 3e6, 1e7])
      expect(impedanceMagnitude(table, f) / impedanceMagnitude(plain, f)).toBeCloseTo(1, 2);
  });
});

describe('worst cases', () => {
  const frequencies = Float64Array.from({ length: 80 }, (_, i) => 1e4 * 3e3 ** (i / 79));

  it('lie inside the envelope, the envelope inside the bound, and in service inside both', () => {
    const { low_ohm, high_ohm, bound_ohm } = envelopeOver(document, frequencies);
    for (const corner of cornersOf(conditionsOf(document.rail).conditions)) {
      const rail = compileRail(networkOf(documentIn(document, corner)));
      frequencies.forEach((f, i) => {
        const z = impedanceMagnitude(rail, f);
        expect(z).toBeGreaterThanOrEqual(low_ohm[i] * (1 - 1e-12));
        expect(z).toBeLessThanOrEqual(high_ohm[i] * (1 + 1e-12));
        expect(high_ohm[i]).toBeLessThanOrEqual(bound_ohm[i]);
      });
    }
  });

  it('are the exact headroom of each corner, the worst first', () => {
    const results = cornerResults(document);
    expect(results.length).toBe(32);
    for (const one of results) {
      const rail = compileRail(networkOf(documentIn(document, one.corner)));
      const { headroom_dB } = tightestHeadroom(rail, document.rail.band_Hz, targetMask(document.rail));
      expect(one.tightest.headroom_dB).toBe(headroom_dB);
    }
    const order = results.map((one) => one.tightest.headroom_dB);
    expect(order).toEqual([...order].sort((a, b) => a - b));
    expect(order[0]).toBeLessThan(headroomOf(documentIn(document, IN_SERVICE)).tightest.headroom_dB);
  });

  it('open every single capacitor, one at a time', () => {
    const serving = documentIn(document, IN_SERVICE);
    const missing = missingParts(serving);
    expect(missing.map((one) => one.part).sort()).toEqual(['bare', 'bulk', 'mid']);
    for (const { line, tightest } of missing) {
      const bank = serving.bank.map((one, i) => (i === line ? { ...one, count: one.count - 1 } : one));
      expect(tightest).toEqual(headroomOf({ ...serving, bank }).tightest);
    }
    const alone: RailDocument = {
      ...serving,
      rail: { ...serving.rail, source: { kind: 'open' }, plane: undefined },
      bank: [{ part: 'bare', count: 1 }],
    };
    expect(missingParts(alone)).toEqual([{ line: 0, part: 'bare', tightest: null, holds: false }]);
  });
});
