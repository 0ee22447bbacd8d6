import { describe, expect, it } from 'vitest';
import { biasFactor, LEAST_EXTENDED_FACTOR } from './bias';
import type { PartBehaviour } from './part-behaviour';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const bare: PartBehaviour = { capacitance_F: 1e-5, esr_ohm: 0.01, esl_H: 1e-9 };
const ceramic = (more: Partial<PartBehaviour> = {}): PartBehaviour => ({
  ...bare,
  technology: 'ceramic',
  dielectric: 'X7R',
  case: '0603',
  rated_voltage_V: 10,
  ...more,
});
const curve = ceramic({
  bias_curve: [
    [0, 1],
    [2, 0.9],
    [5, 0.6],
  ],
});

describe('bias estimate', () => {
  // Read on a vendor's page on derating (low authority): what is left at a voltage, per cent.
  it.each([
    [10, 3.3, 80, 90],
    [10, 5, 60, 80],
    [10, 10, 30, 50],
    [16, 5, 85, 95],
  ])(
    'leaves a middle case rated %d V at %d V between %d and %d %%',
    (rated_voltage_V, volts, least, most) => {
      const { factor, estimated, basis } = biasFactor(ceramic({ rated_voltage_V }), volts);
      expect(100 * factor).toBeGreaterThan(least);
      expect(100 * factor).toBeLessThan(most);
      expect(estimated).toBe(true);
      expect(basis).toBe('estimated by V/V rated and case');
    },
  );

  it('takes more from smaller cases, and far more from Y5V', () => {
    const left = (size: string) => biasFactor(ceramic({ case: size }), 6).factor;
    const sizes = ['01005', '0201', '0402', '0603', '0805', '1206', '1812'];
    for (let i = 1; i < sizes.length; i++) expect(left(sizes[i])).toBeGreaterThan(left(sizes[i - 1]));
    expect(left('1608M')).toBe(left('0603'));
    expect(biasFactor(ceramic({ dielectric: 'Y5V' }), 5).factor).toBeLessThan(0.45);
  });

  it('says what it does not know', () => {
    expect(biasFactor(ceramic({ case: 'odd' }), 5)).toMatchObject({
      factor: biasFactor(ceramic(), 5).factor,
      basis: 'estimated by V/V rated, case unknown',
    });
    expect(biasFactor(ceramic({ dielectric: '' }), 5).basis).toContain('dielectric unknown');
    expect(biasFactor(ceramic({ rated_voltage_V: undefined }), 5)).toMatchObject({
      factor: 1,
      estimated: true,
    });
    expect(biasFactor(ceramic(), 0)).toEqual({ factor: 1, estimated: false, basis: 'no DC voltage' });
  });

  it('is none for what does not lose', () => {
    expect(biasFactor(ceramic({ dielectric: 'NP0' }), 10)).toEqual({
      factor: 1,
      estimated: false,
      basis: 'C0G does not lose with voltage',
    });
    for (const technology of ['polymer', 'tantalum', 'aluminium', 'film'])
      expect(biasFactor({ ...bare, technology }, 5)).toMatchObject({ factor: 1, estimated: false });
    expect(biasFactor(bare, 5)).toEqual({ factor: 1, estimated: false, basis: 'as given' });
  });
});

describe('bias curve', () => {
  it('comes before any estimate', () => {
    expect(biasFactor(curve, 5)).toEqual({ factor: 0.6, estimated: false, basis: 'bias curve' });
    const { factor } = biasFactor(curve, 3.5);
    expect(factor).toBeLessThan(0.9);
    expect(factor).toBeGreaterThan(0.6);
    expect(biasFactor({ ...curve, technology: 'polymer' }, 5).factor).toBe(0.6);
    expect(biasFactor({ ...bare, bias_curve: curve.bias_curve }, 2).factor).toBe(0.9);
  });

  it('goes on falling beyond its last point, marked, down to a floor', () => {
    expect(biasFactor(curve, 7).factor).toBeCloseTo(0.4, 14);
    expect(biasFactor(curve, 7).estimated).toBe(true);
    expect(biasFactor({ ...curve, rated_voltage_V: 50 }, 40).factor).toBe(LEAST_EXTENDED_FACTOR);
    const low = ceramic({
      bias_curve: [
        [0, 1],
        [5, 0.02],
      ],
    });
    expect(biasFactor(low, 9).factor).toBe(0.02);
    const rising = ceramic({
      bias_curve: [
        [0, 1],
        [2, 0.9],
        [5, 0.95],
      ],
    });
    expect(biasFactor(rising, 9).factor).toBe(0.95);
  });

  it('must be a curve of factors above zero', () => {
    const zero = ceramic({
      bias_curve: [
        [0, 1],
        [5, 0],
      ],
    });
    expect(() => biasFactor(zero, 1)).toThrow(fault('bias_curve[1]'));
  });
});

describe('voltage', () => {
  it('above the rating is refused, whatever the part', () => {
    expect(() => biasFactor(ceramic(), 10.1)).toThrow(fault('rated_voltage_V'));
    expect(() => biasFactor(curve, 11)).toThrow(fault('rated_voltage_V'));
    expect(() => biasFactor({ ...bare, rated_voltage_V: 4 }, 5)).toThrow(fault('rated_voltage_V'));
    expect(biasFactor(ceramic(), 10).factor).toBeGreaterThan(0.3);
    // 0.1 + 0.2 is a hair above 0.3.
    expect(biasFactor(ceramic({ rated_voltage_V: 0.3 }), 0.1 + 0.2).factor).toBeGreaterThan(0.3);
  });

  it('must be a number of zero or more, and so must the rating', () => {
    for (const bad of [-1, Number.NaN, Number.POSITIVE_INFINITY])
      expect(() => biasFactor(bare, bad)).toThrow(fault('voltage_V'));
    for (const bad of [0, -1, Number.NaN])
      expect(() => biasFactor(ceramic({ rated_voltage_V: bad }), 0)).toThrow(fault('rated_voltage_V'));
  });
});
