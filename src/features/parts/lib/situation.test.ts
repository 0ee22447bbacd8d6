import { describe, expect, it } from 'vitest';
import { AGES_YEARS, ageOfYears_h, ageText, celsiusText, usualSituation, yearsOfAge } from './situation';

describe('where a part is looked at', () => {
  it.each([
    [6.3, 3.1],
    [4, 2],
    [2.5, 1.26],
    [100, 50],
  ])('begins for a rating of %d V at about half of it, on a step of the control', (rated_voltage_V, at) => {
    expect(usualSituation({ rated_voltage_V })).toMatchObject({ voltage_V: at, age_h: 87_660 });
  });

  it('counts years, and what is younger than the reference as new', () => {
    for (const years of AGES_YEARS) expect(yearsOfAge(ageOfYears_h(years))).toBe(years);
    expect(ageOfYears_h(10)).toBe(87_660);
    expect(ageOfYears_h(0.05)).toBe(1000);
    expect([0, 1, 3, 12.5].map((years) => ageText(ageOfYears_h(years)))).toEqual([
      'new',
      '1 year',
      '3 years',
      '12.5 years',
    ]);
  });

  it('writes temperatures with the minus of numbers', () => {
    expect(celsiusText(-40)).toBe('\u221240\u00a0°C');
    expect(celsiusText(85.04)).toBe('85\u00a0°C');
  });
});
