import { describe, expect, it } from 'vitest';
import { nextLetter } from './draft';

describe('nextLetter', () => {
  it.each([
    [null, 'A'],
    ['A', 'B'],
    ['Z', 'AA'],
    ['AZ', 'BA'],
    ['ZZ', 'AAA'],
  ])('after %s comes %s', (letter, next) => {
    expect(nextLetter(letter)).toBe(next);
  });
});
