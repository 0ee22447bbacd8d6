import { describe, expect, it } from 'vitest';
import { alignDecimal, fractionRoom } from './align-decimal';

const shown = (text: string) => text.replace(/\u00a0/g, '_');

describe('alignDecimal', () => {
  it('brings the decimal points of a column under each other', () => {
    const room = { fraction: 3, unit: 2 };
    const column = ['4.7\u00a0µF', '470\u00a0nF', '12.5\u00a0mΩ', '0.85\u00a0V'].map((text) =>
      shown(alignDecimal(text, room)),
    );
    expect(column).toEqual(['4.7__µF', '470____nF', '12.5__mΩ', '0.85_V_']);
  });

  it('aligns numbers without a unit and leaves a dash alone', () => {
    expect(shown(alignDecimal('12', { fraction: 3, unit: 0 }))).toBe('12___');
    expect(alignDecimal('—', { fraction: 3, unit: 2 })).toBe('—');
  });

  it('keeps the typeset minus with its number', () => {
    expect(shown(alignDecimal('−2.75\u00a0dB', { fraction: 3, unit: 2 }))).toBe('−2.75_dB');
  });

  it('finds the room that a column needs', () => {
    expect(fractionRoom(['4.7\u00a0µF', '470\u00a0nF', '0.85\u00a0V'])).toBe(3);
    expect(fractionRoom(['900\u00a0pH', '—'])).toBe(0);
    expect(fractionRoom([])).toBe(0);
  });
});
