import { describe, expect, it } from 'vitest';
import { shareUnit } from './shared-unit';

describe('two quantities with one unit', () => {
  it('say it once where it is the same, twice where it is not', () => {
    expect(shareUnit('22\u00a0µF', '→', '9.41\u00a0µF')).toBe('22 → 9.41\u00a0µF');
    expect(shareUnit('1\u00a0µF', '→', '880\u00a0nF')).toBe('1\u00a0µF → 880\u00a0nF');
    expect(shareUnit('14.4\u00a0mV', 'of', '24.0\u00a0mV')).toBe('14.4 of 24.0\u00a0mV');
    expect(shareUnit('3\u00a0mV', 'of', '1\u00a0V')).toBe('3\u00a0mV of 1\u00a0V');
  });
});
