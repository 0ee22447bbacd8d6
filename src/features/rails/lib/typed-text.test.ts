import { parseLength } from '@shared/units/parse';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ageInput, ageText, parseAge } from './age-text';
import { celsiusText, parseCelsius } from './celsius-text';
import { millimetres } from './millimetres';

describe('ages', () => {
  it.each([
    ['10', 87_660],
    ['10 a', 87_660],
    ['0.5 years', 4383],
    ['1 year', 8766],
    ['87660 h', 87_660],
    ['5000h', 5000],
    ['2,5', 21_915],
  ])('%s is %d h', (text, hours) => {
    expect(parseAge(text)).toEqual({ ok: true, value: hours });
  });

  it.each(['', '10 days', 'old', '10 000'])('“%s” is refused with a reason', (text) => {
    expect(parseAge(text)).toEqual({ ok: false, reason: expect.stringMatching(/.+/) });
  });

  it('are written so that they read back the same', () => {
    expect(ageInput(87_660)).toBe('10');
    expect(ageInput(12_345)).toBe('12345 h');
    for (const hours of [0, 1000, 8766, 43_830, 1e6, 0.1])
      expect(parseAge(ageInput(hours))).toEqual({ ok: true, value: hours });
    expect(ageText(87_660)).toBe('10\u00a0years');
    expect(ageText(8766)).toBe('1\u00a0year');
    expect(ageText(1000)).toBe('1000\u00a0h');
  });
});

describe('temperatures', () => {
  it('are read with and without their unit, with either minus', () => {
    for (const text of ['-40', '−40', '-40 °C', '−40C'])
      expect(parseCelsius(text)).toEqual({ ok: true, value: -40 });
    for (const text of ['', '°C', '40 K']) expect(parseCelsius(text).ok).toBe(false);
    expect(celsiusText(-40)).toBe('−40\u00a0°C');
  });
});

describe('lengths in millimetres', () => {
  it('read back as the very same double', () => {
    expect(millimetres(1.27e-4)).toBe('0.127');
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 10, noNaN: true }), (metres) => {
        expect(parseLength(millimetres(metres))).toEqual({ ok: true, value: metres });
      }),
      { numRuns: 2000, seed: 7 },
    );
  });
});
