import { describe, expect, it } from 'vitest';
import { differs } from './differs';
import { EMPTY_SPEC } from './spec-form-values';

describe('a form against where it started', () => {
  it('differs as long as something is typed that was not there', () => {
    expect(differs({ ...EMPTY_SPEC }, EMPTY_SPEC)).toBe(false);
    expect(differs({ ...EMPTY_SPEC, name: 'VDD' }, EMPTY_SPEC)).toBe(true);
    expect(differs({ ...EMPTY_SPEC, hasStep: !EMPTY_SPEC.hasStep }, EMPTY_SPEC)).toBe(true);
  });

  it('does not by the order of ticked boxes', () => {
    const start = { ...EMPTY_SPEC, vary: ['capacitance' as const, 'esr' as const] };
    expect(differs({ ...start, vary: ['esr', 'capacitance'] }, start)).toBe(false);
    expect(differs({ ...start, vary: ['esr'] }, start)).toBe(true);
    expect(differs({ ...start, vary: ['esr', 'esl'] }, start)).toBe(true);
  });
});
