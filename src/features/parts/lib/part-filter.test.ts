import { describe, expect, it } from 'vitest';
import { isFiltered, readFilter, writeFilter } from './part-filter';

describe('the parts filter in the address', () => {
  it('comes back as it was written', () => {
    const address = 'q=x7r&technology=ceramic&min_rated_V=6.3&min_F=1e-7&sort=esr_ohm&order=asc&page=3';
    const filter = readFilter(new URLSearchParams(address));
    expect(filter).toMatchObject({ q: 'x7r', min_rated_V: 6.3, min_F: 1e-7, sort: 'esr_ohm', page: 3 });
    expect(readFilter(writeFilter(filter))).toEqual(filter);
  });

  it('leaves out what is not understood', () => {
    const filter = readFilter(new URLSearchParams('technology=wood&min_F=lots&sort=colour&page=-2&q=ok'));
    expect(filter).toEqual({ q: 'ok', sort: 'capacitance_F', order: 'desc', page: 1 });
  });

  it('writes nothing for the whole library in its usual order', () => {
    const filter = readFilter(new URLSearchParams());
    expect(writeFilter(filter).toString()).toBe('');
    expect(isFiltered(filter)).toBe(false);
    expect(isFiltered({ ...filter, state: 'draft' })).toBe(true);
  });
});
