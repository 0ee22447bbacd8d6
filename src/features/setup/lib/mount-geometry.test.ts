import { boardSetupSchema } from '@shared/schemas/board-setup.schema';
import { describe, expect, it } from 'vitest';
import { liveLayers } from './live-layers';
import { pairFigures } from './pair-figures';
import { PAD, planGeometry } from './plan-geometry';
import { liveRecipe, mountAt, type Side } from './recipe-mount';
import { newRecipe } from './recipe-rows';
import { recipeViews } from './recipe-view';
import { sectionGeometry } from './section-geometry';
import { without } from './section-layers';
import { differences } from './setup-diff';
import { type LayerForm, layerForm, type RecipeForm } from './setup-form';
import { beginWith, STARTING_POINTS } from './starting-points';

const eight = () => liveLayers(beginWith('eight')) ?? [];
const shape = (change: Partial<RecipeForm> = {}) => {
  const recipe = liveRecipe({ ...newRecipe([]), ...change });
  if (!recipe) throw new Error('the recipe cannot be read');
  return recipe;
};
const place = (pair = 0, side: Side = 'top') => {
  const layers = eight();
  return { layers, pair: pairFigures(layers)[pair], side };
};
const mountOf = (recipe: ReturnType<typeof shape>, where: ReturnType<typeof place>) => {
  const answer = mountAt(recipe, where);
  if (!('mount' in answer)) throw new Error(answer.reason);
  return answer.mount;
};

describe('plane pairs while one types', () => {
  it('give what the engine says of them', () => {
    const pairs = pairFigures(eight());
    expect(pairs.map((pair) => [pair.upperLabel, pair.lowerLabel])).toEqual([
      ['L2 plane', 'L3 plane'],
      ['L6 plane', 'L7 plane'],
    ]);
    // ε₀·4.2·1 cm²/0.1 mm and μ₀·0.1 mm.
    expect(pairs[0].capacitance_F).toBeCloseTo((8.8541878e-12 * 4.2 * 1e-4) / 1e-4, 17);
    expect(pairs[0].inductance_H).toBeCloseTo(4e-7 * Math.PI * 1e-4, 18);
  });

  it('stand also while two layers are called alike, and those that touch are none', () => {
    const layers = beginWith('eight');
    layers[4].name = layers[2].name;
    expect(pairFigures(liveLayers(layers) ?? [])).toHaveLength(2);
    const touching = layers.filter((_, i) => i !== 3);
    expect(pairFigures(liveLayers(touching) ?? [])).toHaveLength(1);
  });

  it('wait while a number is half typed', () => {
    const typed = (change: Partial<LayerForm>) =>
      beginWith('four').map((l, i) => (i === 1 ? { ...l, ...change } : l));
    expect(liveLayers(typed({ thickness: '4 mi' }))).toBeNull();
    expect(liveLayers(typed({ thickness: '0' }))).toBeNull();
    expect(liveLayers(typed({ permittivity: '' }))).toBeNull();
    expect(liveLayers(typed({ name: '' }))).toHaveLength(7);
  });
});

describe('recipes at a place', () => {
  it('say why there is no inductance', () => {
    const good = newRecipe([]);
    const bad = { ...good, id: 'b', spacing: '0.1' };
    expect(recipeViews([good, bad], null).map((view) => view.reason)).toEqual([
      expect.stringContaining('plane pair'),
      expect.stringContaining('not right'),
    ]);
    const [view] = recipeViews([{ ...good, name: '' }], place());
    expect(view.mount?.total_H).toBeGreaterThan(1e-10);
    const outside = [
      layerForm({ kind: 'copper', name: 'a', use: 'plane', thickness_m: 35e-6 }),
      layerForm({ kind: 'dielectric', name: 'd', relative_permittivity: 4, thickness_m: 1e-4 }),
      layerForm({ kind: 'copper', name: 'b', use: 'plane', thickness_m: 35e-6 }),
      layerForm({ kind: 'dielectric', name: 'e', relative_permittivity: 4, thickness_m: 1e-3 }),
      layerForm({ kind: 'copper', name: 'c', use: 'signal', thickness_m: 35e-6 }),
    ];
    const layers = liveLayers(outside) ?? [];
    const [pair] = pairFigures(layers);
    const top = mountAt(shape(), { layers, pair, side: 'top' });
    if (!('mount' in top)) throw new Error(top.reason);
    expect(top.mount.viaDepth_m).toBe(0);
    const section = sectionGeometry(shape(), { layers, pair, side: 'top' }, top.mount);
    expect(section.viaBottom).toBe(section.surface);
    expect(section.viaEnds[0]).toBe(section.surface);
  });
});

describe('the plan', () => {
  const length = ([[x0, y0], [x1, y1]]: readonly (readonly [number, number])[]) =>
    Math.hypot(x1 - x0, y1 - y0);

  it('draws every trace as long as it is, ending on the first via', () => {
    for (const [traceLength, spacing] of [
      ['0.4', '0.9'],
      ['1.5', '1.2'],
      ['0.5', '2.2'],
      ['0.5', '0.3'],
      ['0.5', '2.5'],
    ]) {
      const plan = planGeometry(shape({ traceLength, spacing }));
      expect(plan.reaches).toBe(true);
      expect(length(plan.trace ?? [])).toBeCloseTo(Number(traceLength), 2);
      expect(plan.trace?.[1]).toEqual(plan.vias[0]);
      expect(2 * plan.vias[0][0]).toBeCloseTo(Number(spacing), 9);
      const [x, y] = plan.trace?.[0] ?? [0, 0];
      expect(x).toBeGreaterThanOrEqual(PAD.inner);
      expect(x).toBeLessThanOrEqual(PAD.outer);
      expect(Math.abs(y)).toBeLessThanOrEqual(PAD.half);
    }
  });

  it('says when vias and pads of a 0402 do not go together', () => {
    expect(planGeometry(shape({ traceLength: '0.3', spacing: '3' })).reaches).toBe(false);
    expect(planGeometry(shape({ traceLength: '0', spacing: '3' })).reaches).toBe(false);
    expect(planGeometry(shape({ traceLength: '0', spacing: '0.9' })).reaches).toBe(true);
  });

  it('puts no via into another, however many there are', () => {
    for (const pairs of ['1', '2', '3', '8'])
      for (const traceLength of ['0', '0.5'])
        for (const spacing of ['0.25', '0.9']) {
          const { vias, drill, ring } = planGeometry(shape({ pairs, traceLength, spacing }));
          expect(vias).toHaveLength(Number(pairs));
          expect(ring).toBeGreaterThan(drill);
          expect(ring).toBeLessThan(2 * vias[0][0]);
          vias.slice(1).forEach(([, y], i) => {
            expect(y - vias[i][1]).toBeGreaterThan(ring);
          });
        }
  });
});

describe('the section', () => {
  it('draws both loops in the sizes that the formulas take', () => {
    for (const side of ['top', 'bottom'] as const)
      for (const pair of [0, 1]) {
        const where = place(pair, side);
        const recipe = shape();
        const mount = mountOf(recipe, where);
        const section = sectionGeometry(recipe, where, mount);
        expect(section.traces).toHaveLength(2);
        for (const [from, to] of section.traces) expect(to - from).toBeCloseTo(0.4, 12);
        expect(section.vias[1] - section.vias[0]).toBeCloseTo(0.9, 12);
        expect(section.traceBottom - section.surface).toBeCloseTo(mount.traceHeight_m * 1000, 12);
        expect(section.viaBottom - section.surface).toBeCloseTo(mount.viaDepth_m * 1000, 12);
        expect(section.viaEnds[0]).toBeLessThan(section.viaEnds[1]);
        expect(section.viaEnds[1]).toBeLessThanOrEqual(section.depth);
      }
  });

  it('opens planes around vias that pass, and joins those that end', () => {
    const where = place();
    const recipe = shape();
    const { layers, vias } = sectionGeometry(recipe, where, mountOf(recipe, where));
    const copperOf = (name: string) => layers.find((one) => one.layer.label === name)?.copper ?? [];
    const covers = (name: string, x: number) => copperOf(name).some(([from, to]) => from <= x && x <= to);
    expect([covers('L2 plane', vias[0]), covers('L2 plane', vias[1])]).toEqual([true, false]);
    expect([covers('L3 plane', vias[0]), covers('L3 plane', vias[1])]).toEqual([false, true]);
    expect(layers.map((one) => one.layer.label)).toContain('L3 plane');
    expect(layers.map((one) => one.layer.label)).not.toContain('L6 plane');
  });

  it('stands on the part’s own pads when the vias are in them', () => {
    const where = place();
    const recipe = shape({ traceLength: '0' });
    const section = sectionGeometry(recipe, where, mountOf(recipe, where));
    expect(section.traces).toEqual([]);
    section.pads.forEach(([from, to], i) => {
      expect(to - from).toBeCloseTo(PAD.outer - PAD.inner, 12);
      expect(section.vias[i]).toBeGreaterThan(from);
      expect(section.vias[i]).toBeLessThan(to);
    });
  });

  it('cuts spans around gaps', () => {
    expect(without([0, 10], [])).toEqual([[0, 10]]);
    expect(
      without(
        [0, 10],
        [
          [2, 3],
          [5, 6],
        ],
      ),
    ).toEqual([
      [0, 2],
      [3, 5],
      [6, 10],
    ]);
    expect(
      without(
        [0, 10],
        [
          [-1, 4],
          [3, 6],
          [9, 12],
        ],
      ),
    ).toEqual([[6, 9]]);
  });
});

describe('what differs between two setups', () => {
  const setup = boardSetupSchema.parse({ stackup: { layers: STARTING_POINTS.four }, recipes: [shape()] });

  it('is said by the names of layers and recipes', () => {
    expect(differences(setup, setup)).toEqual([]);
    const other = structuredClone(setup);
    if (other.stackup) other.stackup.layers[2].thickness_m = 18e-6;
    other.recipes[0] = { ...shape(), id: setup.recipes[0].id, name: 'renamed' };
    expect(differences(setup, other)).toEqual(['layer L2 plane', 'recipe “renamed”']);
    expect(differences(setup, { stackup: null, recipes: [] })).toEqual([
      'the number of layers',
      `recipe “${setup.recipes[0].name}”`,
    ]);
  });
});
