import { expect, it } from 'vitest';
import { valueCode, voltageCode } from './part-families';

it.each([
  [100e-12, '100P'],
  [4.7e-9, '4N7'],
  [100e-9, '100N'],
  [1e-6, '1U'],
  [2.2e-6, '2U2'],
  [470e-6, '470U'],
])('writes %d F as %s', (farad, code) => {
  expect(valueCode(farad)).toBe(code);
});

it('writes a voltage with its point as V', () => {
  expect([6.3, 16, 2.5].map(voltageCode)).toEqual(['6V3', '16', '2V5']);
});
