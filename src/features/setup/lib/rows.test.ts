import { describe, expect, it } from 'vitest';
import { freeName, insertLayer, moveLayer, removeLayer } from './layer-rows';
import { duplicateRecipe, newRecipe } from './recipe-rows';
import { beginWith } from './starting-points';

const keys = (layers: readonly { key: string }[]) => layers.map((layer) => layer.key);

describe('layers', () => {
  it('move by one place and stay at the ends', () => {
    const layers = beginWith('four');
    const [a, b, ...rest] = keys(layers);
    expect(keys(moveLayer(layers, a, 1))).toEqual([b, a, ...rest]);
    expect(keys(moveLayer(layers, b, -1))).toEqual([b, a, ...rest]);
    expect(moveLayer(layers, a, -1)).toBe(layers);
    expect(moveLayer(layers, rest[rest.length - 1], 1)).toBe(layers);
    expect(moveLayer(layers, 'nobody', 1)).toBe(layers);
  });

  it('are added beside another, of the other kind, under a free name', () => {
    const layers = beginWith('four');
    const [below, key] = insertLayer(layers, layers[0].key, 'below');
    expect(below[1]).toMatchObject({ key, kind: 'dielectric', name: 'new dielectric' });
    const [above, second] = insertLayer(below, key, 'above');
    expect(above[1]).toMatchObject({ key: second, kind: 'signal', name: 'new copper' });
    const [again] = insertLayer(above, above[0].key, 'above');
    expect(again[0].name).toBe('new dielectric 2');
    expect(new Set(keys(again)).size).toBe(layers.length + 3);
  });

  it('go, and the next one takes their place', () => {
    const layers = beginWith('four');
    const [rest, next] = removeLayer(layers, layers[2].key);
    expect(rest).toHaveLength(layers.length - 1);
    expect(next).toBe(layers[3].key);
    expect(removeLayer(layers, layers[6].key)[1]).toBe(layers[5].key);
    expect(removeLayer([layers[0]], layers[0].key)).toEqual([[], null]);
  });

  it('find names that nobody has', () => {
    expect(freeName('core', ['prepreg'])).toBe('core');
    expect(freeName('core', ['CORE', ' core 2 '])).toBe('core 3');
  });
});

describe('recipes', () => {
  it('are duplicated right after their pattern, however long its name', () => {
    const first = { ...newRecipe([]), name: 'x'.repeat(80) };
    const second = newRecipe([first]);
    const [list, id] = duplicateRecipe([first, second], first.id);
    expect(list.map((recipe) => recipe.id)).toEqual([first.id, id, second.id]);
    expect(list[1]).toEqual({ ...first, id, name: `${'x'.repeat(70)} copy` });
    const [again] = duplicateRecipe(list, first.id);
    expect(again[1].name).toBe(`${'x'.repeat(70)} copy 2`);
    expect(again[1].name.length).toBeLessThanOrEqual(80);
  });
});
