import { describe, expect, it } from 'vitest';
import { familyOf } from './family';

describe('family of a part', () => {
  it.each([
    ['ceramic', 'ceramic'],
    ['MLCC', 'ceramic'],
    ['polymer', 'polymer'],
    ['Aluminium polymer', 'polymer'],
    ['tantalum', 'tantalum'],
    ['aluminum electrolytic', 'aluminium'],
    ['Film', 'film'],
    ['wood', 'bare'],
    ['', 'bare'],
  ])('of %s is %s', (technology, kind) => expect(familyOf({ technology }).kind).toBe(kind));

  it('goes by the dielectric code where the technology says nothing, and never against it', () => {
    expect(familyOf({})).toEqual({ kind: 'bare' });
    expect(familyOf({ dielectric: 'X7R' })).toMatchObject({ kind: 'ceramic', dielectric: { code: 'X7R' } });
    expect(familyOf({ technology: 'chip', dielectric: 'C0G' }).kind).toBe('ceramic');
    expect(familyOf({ technology: 'polymer', dielectric: 'X7R' })).toEqual({ kind: 'polymer' });
    expect(familyOf({ technology: 'ceramic', dielectric: 'best' })).toEqual({
      kind: 'ceramic',
      dielectric: null,
    });
    expect(familyOf({ dielectric: 'best' }).kind).toBe('bare');
  });
});
