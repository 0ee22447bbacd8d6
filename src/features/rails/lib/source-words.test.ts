import type { Source } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { sourceMagnitude_ohm, spreadOver } from './source-curve';
import { sourceText } from './source-words';

const band = [1e4, 3e7] as const;
const text = (source: Source) => sourceText(source, band).replaceAll('\u00a0', ' ');
const damped = {
  kind: 'damped',
  series_resistance_ohm: 0.4e-3,
  series_inductance_H: 0,
  inductor_resistance_ohm: 0.2e-3,
  inductance_H: 9e-9,
  damping_ohm: 5e-3,
  damping_inductance_H: 0,
} as const satisfies Source;
const table = {
  kind: 'table',
  points: [
    [1e5, 1e-3, 2e-3],
    [1e6, 1e-3, 2e-2],
  ],
} satisfies Source;

describe('the source in words', () => {
  it('names the asymptotes of R and L', () => {
    // 2 mΩ ÷ (2π · 40 nH) = 7.96 kHz
    expect(text({ kind: 'rl', resistance_ohm: 2e-3, inductance_H: 4e-8 })).toBe(
      '2 mΩ at DC, rising as 40 nH from 7.96 kHz',
    );
    expect(text({ kind: 'rl', resistance_ohm: 2e-3, inductance_H: 0 })).toBe('2 mΩ at every frequency');
    expect(text({ kind: 'rl', resistance_ohm: 0, inductance_H: 4e-8 })).toBe('rising as 40 nH all the way');
  });

  it('names the level stretches of a damped source', () => {
    // 0.4 mΩ + (0.2 mΩ ∥ 5 mΩ); 5 mΩ ÷ (2π · 9 nH) = 88.4 kHz
    expect(text(damped)).toBe('592 µΩ at DC, 5.4 mΩ from 88.4 kHz');
    // 5.4 mΩ ÷ (2π · 100 pH) = 8.59 MHz
    expect(text({ ...damped, series_inductance_H: 1e-10 })).toBe(
      '592 µΩ at DC, 5.4 mΩ from 88.4 kHz, rising as 100 pH from 8.59 MHz',
    );
  });

  it('says what is seen at the band’s ends where there is no such stretch', () => {
    expect(text({ ...damped, damping_ohm: 0.1e-3 })).toBe('493 µΩ at 10 kHz, 500 µΩ at 30 MHz');
    // 2π · 10 kHz · (1 µH + 9 nH) and 2π · 30 MHz · 1 µH, resistances beside them small
    expect(text({ ...damped, series_inductance_H: 1e-6 })).toBe('63.4 mΩ at 10 kHz, 188 Ω at 30 MHz');
  });

  it('says what a table covers and where it is guessed', () => {
    expect(text(table)).toBe(
      '2 points cover 100 kHz to 1 MHz; below 100 kHz and above 1 MHz the series R–L–C that fits them best goes on',
    );
    expect(sourceText(table, [1e5, 1e6])).toMatch(/: the whole band$/);
    expect(text({ kind: 'open' })).toMatch(/^no source/);
  });
});

describe('the curve of a source', () => {
  it('meets its asymptotes', () => {
    const [low, level] = sourceMagnitude_ohm(damped, [1, 1e7]) ?? [];
    expect(low * 1e6).toBeCloseTo(592.3, 1);
    expect(level * 1e3).toBeCloseTo(5.4, 3);
    expect(sourceMagnitude_ohm(table, [1e5])).toEqual([expect.closeTo(Math.hypot(1e-3, 2e-3), 12)]);
  });

  it('is none of an open source and of one that the engine refuses', () => {
    expect(sourceMagnitude_ohm({ kind: 'open' }, [1e5])).toBeNull();
    expect(sourceMagnitude_ohm({ kind: 'rl', resistance_ohm: 0, inductance_H: 0 }, [1e5])).toBeNull();
  });

  it('is sampled from end to end', () => {
    const f = spreadOver(band, 3);
    expect(f[0]).toBe(1e4);
    expect(f[1] / Math.sqrt(1e4 * 3e7)).toBeCloseTo(1, 12);
    expect(f[2] / 3e7).toBeCloseTo(1, 12);
  });
});
