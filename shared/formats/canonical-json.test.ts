import fc from 'fast-check';
import { expect, it } from 'vitest';
import { canonicalJson } from './canonical-json';

it('gives equal bytes for equal values, whatever the order of their keys', () => {
  expect(canonicalJson({ b: 1, a: [{ d: null, c: 'x' }] })).toBe('{"a":[{"c":"x","d":null}],"b":1}');
  expect(canonicalJson({ 10: 'a', 9: 'b', a: undefined })).toBe(canonicalJson({ 9: 'b', 10: 'a' }));
});

it('says the same as the value, and is its own canonical form', () => {
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      const text = canonicalJson(value);
      expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(value)));
      expect(canonicalJson(JSON.parse(text))).toBe(text);
    }),
    { seed: 4780 },
  );
});
