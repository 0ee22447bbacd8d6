import { boardSetupSchema } from '@shared/schemas/board-setup.schema';
import { describe, expect, it } from 'vitest';
import { faultCount, faultsAtFields, NO_FAULTS, together } from './field-faults';
import { newId } from './new-id';
import { readSetup } from './read-setup';
import { formOf, type SetupForm } from './setup-form';
import { beginWith, STARTING_POINTS } from './starting-points';

const setup = boardSetupSchema.parse({
  stackup: { layers: STARTING_POINTS.eight },
  recipes: ['first', 'second', 'third'].map((name) => ({
    id: newId(),
    name,
    trace_length_m: 0.4e-3,
    trace_width_m: 0.127e-3,
    via_drill_m: 0.2e-3,
    via_spacing_m: 0.9e-3,
    via_pairs: 2,
    coupling: 0.3,
  })),
});

const form = (change: (form: SetupForm) => void = () => undefined): SetupForm => {
  const copy = formOf(setup);
  change(copy);
  return copy;
};
const layersOf = (typed: SetupForm) => typed.layers ?? [];
const faultsIn = (typed: SetupForm) => {
  const answer = readSetup(typed);
  if (!('faults' in answer)) throw new Error('nothing is wrong with it');
  return faultsAtFields(typed, answer.faults);
};

describe('the form', () => {
  it('reads back exactly what it was filled with', () => {
    expect(readSetup(form())).toEqual({ setup });
    const odd = structuredClone(setup);
    if (odd.stackup) odd.stackup.layers[1].thickness_m = 4 * 2.54e-5;
    odd.recipes[0].trace_width_m = 5 * 2.54e-5;
    const answer = readSetup(formOf(odd));
    expect('setup' in answer && answer.setup.stackup?.layers[1].thickness_m).toBeCloseTo(101.6e-6, 15);
    expect('setup' in answer && answer.setup.recipes[0].trace_width_m).toBeCloseTo(127e-6, 15);
  });

  it('reads thicknesses as engineers type them', () => {
    for (const [text, metres] of [
      ['35u', 35e-6],
      ['0.1', 1e-4],
      ['0.1 mm', 1e-4],
      ['4 mil', 101.6e-6],
      ['17.5 µm', 17.5e-6],
    ] as const) {
      const answer = readSetup(
        form((f) => {
          layersOf(f)[1].thickness = text;
        }),
      );
      expect('setup' in answer && answer.setup.stackup?.layers[1].thickness_m).toBeCloseTo(metres, 12);
    }
  });

  it('leaves out what is to be removed, and may have no stack-up', () => {
    const answer = readSetup(
      form((f) => {
        f.recipes[1].removed = true;
        f.layers = null;
      }),
    );
    expect(answer).toEqual({ setup: { stackup: null, recipes: [setup.recipes[0], setup.recipes[2]] } });
  });

  it('begins with stack-ups that may be saved, and says that they are typical', () => {
    for (const which of ['four', 'eight'] as const) {
      const layers = beginWith(which);
      const answer = readSetup({ layers, recipes: [] });
      if (!('setup' in answer)) throw new Error('it cannot be saved');
      const total = answer.setup.stackup?.layers.reduce((sum, layer) => sum + layer.thickness_m, 0) ?? 0;
      expect(total).toBeGreaterThan(1.5e-3);
      expect(total).toBeLessThan(1.7e-3);
      for (const layer of layers) if (layer.kind === 'dielectric') expect(layer.name).toContain('typical');
    }
  });
});

describe('what is wrong', () => {
  it('stands at its field, once', () => {
    const typed = form((f) => {
      layersOf(f)[3].thickness = 'thin';
      layersOf(f)[3].permittivity = '0.5';
      f.recipes[2].spacing = '0.1';
      f.recipes[0].pairs = 'two';
    });
    const faults = faultsIn(typed);
    const fourth = layersOf(typed)[3];
    expect(faults.layers[fourth.key]).toEqual({
      thickness: expect.stringContaining('thin'),
      permittivity: expect.stringContaining('at least 1'),
    });
    expect(faults.recipes[typed.recipes[2].id]).toEqual({ spacing: expect.stringContaining('drill') });
    expect(faults.recipes[typed.recipes[0].id]).toEqual({ pairs: expect.stringContaining('two') });
    expect(faultCount(faults)).toBe(4);
  });

  it('between layers stands at the lower one', () => {
    const typed = form((f) => {
      layersOf(f)[4].name = layersOf(f)[2].name;
      layersOf(f)[5].kind = 'plane';
    });
    const [, , , , fifth, sixth, seventh] = layersOf(typed);
    expect(faultsIn(typed).layers).toEqual({
      [fifth.key]: { name: expect.stringContaining('has this name') },
      [sixth.key]: { kind: expect.stringContaining('needs a dielectric') },
      [seventh.key]: { kind: expect.stringContaining('needs a dielectric') },
    });
  });

  it('finds its recipe also when one before it goes', () => {
    const typed = form((f) => {
      f.recipes[0].removed = true;
      f.recipes[2].drill = '';
    });
    expect(Object.keys(faultsIn(typed).recipes)).toEqual([typed.recipes[2].id]);
    const theirs = faultsAtFields(typed, [{ path: 'setup.recipes[0].name', message: 'taken' }]);
    expect(theirs.recipes).toEqual({ [typed.recipes[1].id]: { name: 'taken' } });
  });

  it('of the whole is kept where no field can be named', () => {
    const typed = form();
    const theirs = faultsAtFields(typed, [
      { path: 'setup.recipes', message: 'used by VDD' },
      { path: 'setup.stackup', message: 'VDD: no such layer' },
      { path: 'setup.stackup.layers', message: 'too few' },
      { path: 'version', message: 'odd' },
      { path: 'setup.stackup.layers[99].name', message: 'which?' },
    ]);
    expect(theirs).toMatchObject({
      recipeList: ['used by VDD'],
      stackup: ['VDD: no such layer', 'too few', 'which?'],
      other: ['odd'],
    });
    expect(faultCount(theirs)).toBe(5);
  });

  it('now comes before what the server said of it before', () => {
    const a = { ...NO_FAULTS, layers: { k: { name: 'mine' } }, stackup: ['s'] };
    const b = { ...NO_FAULTS, layers: { k: { name: 'theirs', kind: 'kind' }, l: { name: 'other' } } };
    expect(together(a, b)).toMatchObject({
      layers: { k: { name: 'mine', kind: 'kind' }, l: { name: 'other' } },
      stackup: ['s'],
    });
  });
});

describe('a new identifier', () => {
  it('is a UUID, and another each time', () => {
    const ids = Array.from({ length: 50 }, newId);
    expect(new Set(ids).size).toBe(50);
    for (const id of ids)
      expect(id).toMatch(/^[\da-f]{8}-[\da-f]{4}-4[\da-f]{3}-[89ab][\da-f]{3}-[\da-f]{12}$/);
  });
});
