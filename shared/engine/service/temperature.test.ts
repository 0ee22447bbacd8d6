import { describe, expect, it } from 'vitest';
import type { PartBehaviour } from './part-behaviour';
import { temperatureFactor } from './temperature';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const bare: PartBehaviour = { capacitance_F: 1e-6, esr_ohm: 0.01, esl_H: 1e-9 };
const ceramic = (dielectric: string): PartBehaviour => ({ ...bare, technology: 'ceramic', dielectric });

describe('temperature', () => {
  it('is a band with a class 2 code, closed at its reference', () => {
    expect(temperatureFactor(ceramic('X7R'), 60)).toEqual({
      factor: 1,
      low: 0.85,
      high: 1.15,
      estimated: true,
      basis: 'X7R limits',
    });
    expect(temperatureFactor(ceramic('X7R'), 25)).toMatchObject({ low: 1, high: 1, estimated: false });
    expect(temperatureFactor(ceramic('2R1'), 20)).toMatchObject({ low: 1, high: 1 });
    expect(temperatureFactor(ceramic('2R1'), 25)).toMatchObject({ low: 0.85, high: 1.15 });
    expect(temperatureFactor(ceramic('Y5V'), 0).low).toBeCloseTo(0.18, 14);
  });

  it('outside a code’s range still answers, and says so', () => {
    expect(temperatureFactor(ceramic('X5R'), 85).basis).toBe('X5R limits');
    expect(temperatureFactor(ceramic('X5R'), 90)).toMatchObject({
      low: 0.85,
      estimated: true,
      basis: 'X5R limits, outside its −55 … 85 °C',
    });
  });

  it('is a value with a narrow band with a class 1 code', () => {
    const c0g = temperatureFactor(ceramic('C0G'), 125);
    expect(c0g).toMatchObject({ factor: 1, estimated: false });
    expect(c0g.high - 1).toBeCloseTo(0.003, 12);
    const u2j = temperatureFactor(ceramic('U2J'), -55);
    expect(u2j.factor).toBeCloseTo(1.06, 12);
    expect(u2j.factor - u2j.low).toBeCloseTo(0.0096, 12);
    expect(temperatureFactor(ceramic('C0G'), 150)).toMatchObject({ estimated: true });
  });

  it('follows the part’s curve, held at its ends', () => {
    const part: PartBehaviour = {
      ...ceramic('X7R'),
      temperature_curve: [
        [-40, 0.9],
        [25, 1],
        [85, 0.94],
      ],
    };
    expect(temperatureFactor(part, 85)).toEqual({
      factor: 0.94,
      low: 0.94,
      high: 0.94,
      estimated: false,
      basis: 'temperature curve',
    });
    expect(temperatureFactor(part, -55)).toMatchObject({ factor: 0.9, estimated: true });
    expect(temperatureFactor(part, 125)).toMatchObject({ factor: 0.94, estimated: true });
    const zero: PartBehaviour = {
      ...bare,
      temperature_curve: [
        [0, 0],
        [25, 1],
      ],
    };
    expect(() => temperatureFactor(zero, 20)).toThrow(fault('temperature_curve[0]'));
  });

  it('has a usual drift for the others, from 20 °C', () => {
    const of = (technology: string, T: number) => temperatureFactor({ ...bare, technology }, T);
    expect(of('aluminium', -20).factor).toBeCloseTo(0.9, 14);
    expect(of('aluminium', 70).factor).toBeCloseTo(1.05, 14);
    expect(of('tantalum', 70)).toMatchObject({ factor: 1, low: 0.97, high: 1.03, estimated: true });
    expect(of('polymer', 0).low).toBeCloseTo(0.99, 14);
    expect(of('film', 120).high).toBeCloseTo(1.03, 14);
    for (const technology of ['aluminium', 'tantalum', 'polymer', 'film'])
      expect(of(technology, 20)).toMatchObject({ factor: 1, low: 1, high: 1, estimated: false });
  });

  it('takes a bare part as it stands, and a ceramic without a code as the usual one', () => {
    expect(temperatureFactor(bare, 85)).toMatchObject({
      low: 1,
      high: 1,
      estimated: false,
      basis: 'as given',
    });
    expect(temperatureFactor(ceramic('?'), 85)).toMatchObject({ low: 0.85, high: 1.15, estimated: true });
    expect(temperatureFactor(ceramic('?'), 25)).toMatchObject({ low: 1, high: 1, estimated: false });
  });

  it('must be one', () => {
    for (const bad of [Number.NaN, Number.NEGATIVE_INFINITY, -300])
      expect(() => temperatureFactor(bare, bad)).toThrow(fault('temperature_C'));
  });
});
