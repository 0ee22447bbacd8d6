import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatDecibel,
  formatInput,
  formatLength,
  formatLetterCode,
  formatQuantity,
  formatVolts,
} from './format';
import { parseLength, parseQuantity } from './parse';

const value = (text: string, unit: Parameters<typeof parseQuantity>[1]) => {
  const parsed = parseQuantity(text, unit);
  return parsed.ok ? parsed.value : parsed.reason;
};
const NB = '\u00a0';

describe('reading quantities', () => {
  it.each([
    ['4u7', 'F', 4.7e-6],
    ['4.7uF', 'F', 4.7e-6],
    ['4.7 µF', 'F', 4.7e-6],
    ['4,7u', 'F', 4.7e-6],
    ['100n', 'F', 1e-7],
    ['4R7', 'Ω', 4.7],
    ['R47', 'Ω', 0.47],
    ['0R012', 'Ω', 0.012],
    ['12m', 'Ω', 0.012],
    ['12 mohm', 'Ω', 0.012],
    ['4k7', 'Ω', 4700],
    ['4K7', 'Ω', 4700],
    ['2M2', 'Ω', 2.2e6],
    ['0.5 nH', 'H', 5e-10],
    ['730p', 'H', 7.3e-10],
    ['35 MHz', 'Hz', 3.5e7],
    ['1e-9', 'H', 1e-9],
    ['1.5e3', 'Hz', 1500],
    ['-3.5', 'dB', -3.5],
    ['−3.5', 'dB', -3.5],
    ['3 %', '%', 3],
    ['.5', 'V', 0.5],
    ['1F5', 'F', 1.5],
    ['6V3', 'V', 6.3],
  ] as const)('%s in %s', (text, unit, expected) => {
    expect(value(text, unit)).toBe(expected);
  });

  it.each([
    ['', 'V'],
    ['abc', 'V'],
    ['4.7 pF', 'Ω'],
    ['4u7H', 'F'],
    ['1..2', 'V'],
    ['3 apples', 'A'],
    ['1e999', 'V'],
    ['NaN', 'V'],
    ['Infinity', 'V'],
    ['5k', '%'],
  ] as const)('refuses %s as %s with a reason', (text, unit) => {
    expect(value(text, unit)).toEqual(expect.stringMatching(/.+/));
  });

  it('does not take megahertz in small letters for millihertz', () => {
    expect(value('30 mhz', 'Hz')).toContain('MHz');
    expect(value('30mHz', 'Hz')).toBe(0.03);
    expect(value('x'.repeat(3000), 'V').toString().length).toBeLessThan(60);
  });

  it('asks what a comma means where it could mean either', () => {
    expect(value('1,500', 'Hz')).toContain('1.500 or 1500');
    expect(value('0,125', 'V')).toBe(0.125);
    expect(value('1,234,567', 'Hz')).toContain('without commas');
    expect(parseLength('1,234')).toMatchObject({
      ok: false,
      reason: expect.stringContaining('could mean either'),
    });
    expect(parseLength('0,25')).toEqual({ ok: true, value: 2.5e-4 });
  });

  it('reads lengths, bare ones as millimetres', () => {
    expect(parseLength('12')).toEqual({ ok: true, value: 0.012 });
    expect(parseLength('100um')).toEqual({ ok: true, value: 1e-4 });
    for (const text of ['35u', '35 µ', '35 μm'])
      expect(parseLength(text)).toEqual({ ok: true, value: 3.5e-5 });
    // 1 inch = 25.4 mm exactly (International yard and pound agreement, 1959)
    expect(parseLength('5 mil')).toEqual({ ok: true, value: 5 * 2.54e-5 });
    expect(parseLength('3 ft').ok).toBe(false);
  });
});

describe('IEC 60062 letter codes', () => {
  // Worked codes from the published list (capacitor and resistor code pages; KEMET C1210F data sheet).
  it.each([
    ['4R7', 'Ω', 4.7],
    ['R47', 'Ω', 0.47],
    ['1R0', 'Ω', 1],
    ['2n2', 'F', 2.2e-9],
  ] as const)('%s', (code, unit, expected) => {
    expect(value(code, unit)).toBe(expected);
  });

  it('writes and reads back every value of the E24 and E96 series over all decades exactly', () => {
    // IEC 60063: E24 as printed; E96 = 10^(i/96) rounded to two decimals.
    const e24 = [
      1, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2, 2.2, 2.4, 2.7, 3, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8, 7.5,
      8.2, 9.1,
    ];
    const e96 = Array.from({ length: 96 }, (_, i) => Math.round(10 ** (i / 96) * 100) / 100);
    for (const mantissa of [...e24, ...e96])
      for (let decade = -12; decade <= 6; decade++) {
        const v = Number(`${mantissa}e${decade}`);
        for (const unit of ['Ω', 'F', 'H'] as const) expect(value(formatLetterCode(v, unit), unit)).toBe(v);
      }
    expect(formatLetterCode(4.7e-6, 'F')).toBe('4u7');
    expect(formatLetterCode(4.7, 'Ω')).toBe('4R7');
    expect(formatLetterCode(4.7, 'F')).toBe('4F7');
  });
});

describe('writing quantities', () => {
  it.each([
    [0.0117, 'Ω', `11.7${NB}mΩ`],
    [8.5e-3, 'Ω', `8.50${NB}mΩ`],
    [7.3e-10, 'H', `730${NB}pH`],
    [18.1e6, 'Hz', `18.1${NB}MHz`],
    [999.96e-3, 'Ω', `1.00${NB}Ω`],
    [-2.5e-3, 'V', `−2.50${NB}mV`],
    [0, 'Ω', `0${NB}Ω`],
  ] as const)('%d %s', (v, unit, expected) => {
    expect(formatQuantity(v, unit)).toBe(expected);
  });

  it('trims, signs and leaves blanks as agreed', () => {
    expect(formatQuantity(1e4, 'Hz', { trim: true })).toBe(`10${NB}kHz`);
    expect(formatQuantity(null, 'Hz')).toBe('—');
    expect(formatQuantity(Number.POSITIVE_INFINITY, 'Ω')).toBe('∞');
    expect(formatQuantity(85.234, 'mm²')).toBe(`85.2${NB}mm²`);
    expect(formatDecibel(-2.71)).toBe(`−2.7${NB}dB`);
    expect(formatDecibel(-0.01)).toBe(`0.0${NB}dB`);
    expect(formatDecibel(2.4)).toBe(`+2.4${NB}dB`);
    expect(formatVolts(0.85)).toBe(`0.85${NB}V`);
    expect(formatVolts(48)).toBe(`48${NB}V`);
    expect(formatLength(0.0125)).toBe(`12.5${NB}mm`);
  });

  it('gives text that reads back as the very same double', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-15, max: 9e14, noNaN: true }), fc.boolean(), (v, negative) => {
        const signed = negative ? -v : v;
        for (const unit of ['F', 'Ω', 'Hz'] as const) expect(value(formatInput(signed), unit)).toBe(signed);
      }),
      { numRuns: 2000, seed: 7 },
    );
  });

  it('rounds to the digits shown, never to a mantissa of 1000', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-14, max: 1e13, noNaN: true }), (v) => {
        const [mantissa] = formatQuantity(v, 'Ω').split(NB);
        const shown = value(formatQuantity(v, 'Ω').replace(NB, ' '), 'Ω');
        expect(Number(mantissa)).toBeLessThan(1000);
        expect(Math.abs(Number(shown) / v - 1)).toBeLessThanOrEqual(0.0051);
      }),
      { numRuns: 2000, seed: 7 },
    );
  });
});
