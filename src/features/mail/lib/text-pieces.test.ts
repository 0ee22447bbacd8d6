import { describe, expect, it } from 'vitest';
import { textPieces } from './text-pieces';

const hrefs = (text: string) => textPieces(text).flatMap((piece) => piece.href ?? []);
const joined = (text: string) =>
  textPieces(text)
    .map((piece) => piece.text)
    .join('');

describe('textPieces', () => {
  it('finds addresses without the full stop behind them', () => {
    const text = 'Open http://localhost:4780/invitation/abc_DEF-1.\nOr (https://example.org/x?a=1), please.';
    expect(hrefs(text)).toEqual(['http://localhost:4780/invitation/abc_DEF-1', 'https://example.org/x?a=1']);
    expect(joined(text)).toBe(text);
  });

  it('leaves everything else as text', () => {
    const text = 'javascript:alert(1) <b>no</b> ftp://x http:// end';
    expect(hrefs(text)).toEqual([]);
    expect(joined(text)).toBe(text);
  });
});
