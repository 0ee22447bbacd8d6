import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync(new URL('./tokens.css', import.meta.url), 'utf8');
const palette = (block: string) =>
  Object.fromEntries([...block.matchAll(/--([a-z]+):\s*(#[0-9a-f]{6})/g)].map((m) => [m[1], m[2]]));
const [light, dark] = css.split(':root[data-theme="dark"]').map(palette);

/** Relative luminance and contrast as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const c = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [high, low] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

describe.each([
  ['by day', light],
  ['at night', dark],
])('the palette %s', (_, colours) => {
  it.each(['ink', 'deep', 'stone', 'reed', 'kingfisher', 'brass'])(
    'reads %s at 4.5 : 1 on paper and on wash',
    (name) => {
      expect(contrast(colours[name], colours.paper)).toBeGreaterThanOrEqual(4.5);
      expect(contrast(colours[name], colours.wash)).toBeGreaterThanOrEqual(4.5);
    },
  );

  it('reads paper on a filled button at 4.5 : 1', () => {
    expect(contrast(colours.paper, colours.deep)).toBeGreaterThanOrEqual(4.5);
  });
});
