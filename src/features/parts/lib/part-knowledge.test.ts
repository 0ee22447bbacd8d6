import { type Part, partSchema } from '@shared/schemas/part.schema';
import { describe, expect, it } from 'vitest';
import {
  ageing,
  eslSpread,
  esrSpread,
  estimatedRespects,
  impedanceModel,
  isLossy,
  overBias,
  overTemperature,
  temperatureRange,
} from './part-knowledge';

const part = (change: Partial<Part> = {}): Part =>
  partSchema.parse({
    id: '00000000-0000-4000-8000-000000000001',
    partNumber: 'C-1',
    technology: 'ceramic',
    dielectric: 'X5R',
    caseSize: '0402',
    capacitance_F: 1e-5,
    tolerance: 'M',
    rated_voltage_V: 4,
    esr_ohm: 0.004,
    esl_H: 3e-10,
    mount_H: 5e-10,
    state: 'draft',
    version: 1,
    createdAt: '2026-01-01T00:00:00.000Z',
    updatedAt: '2026-01-01T00:00:00.000Z',
    updatedBy: null,
    ...change,
  });
const RESPECTS = [temperatureRange, overBias, overTemperature, ageing, esrSpread, eslSpread];

describe('what is known of a part', () => {
  it('is estimated in every respect of which nothing is entered but the code', () => {
    expect(RESPECTS.map((of) => of(part()).estimated)).toEqual([false, true, true, true, true, true]);
    expect(estimatedRespects(part())).toEqual(['bias', 'temperature', 'ageing']);
    expect(temperatureRange(part()).text).toContain('85\u00a0°C, by its code');
    expect(overBias(part()).text).not.toContain('estimated');
  });

  it('is the maker’s where it is entered', () => {
    const known = part({
      bias_curve: [
        [0, 1],
        [4, 0.2],
      ],
      temperature_curve: [
        [-40, 0.9],
        [25, 1],
        [85, 0.9],
      ],
      ageing_percent_per_decade: 3,
      esr_tolerance_percent: 20,
      esl_tolerance_percent: 0,
    });
    for (const of of RESPECTS) expect(of(known).estimated).toBe(false);
    expect(estimatedRespects(known)).toEqual([]);
    expect(overBias(known).text).toBe('curve, 2 points');
    expect(temperatureRange(known).text).toBe('\u221240 … 85\u00a0°C, by its curve');
    expect(ageing(known).text).toBe('3\u00a0% a decade of hours, from 1000 h on');
    expect([esrSpread(known).text, eslSpread(known).text]).toEqual(['±20\u00a0%', 'none']);
  });

  it('needs no estimate for what does not lose', () => {
    const stable = part({ dielectric: 'C0G' });
    expect(estimatedRespects(stable)).toEqual([]);
    expect(ageing(stable)).toEqual({ text: 'none', estimated: false });
    expect(isLossy(stable)).toBe(false);
    expect([isLossy(part()), isLossy(part({ dielectric: '' }))]).toEqual([true, true]);
    const bulk = part({ technology: 'aluminium', dielectric: '' });
    expect(isLossy(bulk)).toBe(false);
    expect(estimatedRespects(bulk)).toEqual(['temperature']);
    expect(temperatureRange(bulk)).toMatchObject({ estimated: true });
  });

  it('names what its impedance comes from', () => {
    const esr_table: Part['esr_table'] = [
      [1e3, 0.02],
      [1e6, 0.005],
    ];
    const impedance_table: Part['impedance_table'] = [
      [1e3, 0.02, -16],
      [1e6, 0.005, 0.1],
      [1e8, 0.05, 1],
    ];
    expect(impedanceModel(part()).text).toBe('C, ESR and ESL');
    expect(impedanceModel(part({ esr_table })).text).toBe('ESR over frequency, 2 points');
    expect(impedanceModel(part({ esr_table, impedance_table })).text).toBe('measured, 3 points');
  });
});
