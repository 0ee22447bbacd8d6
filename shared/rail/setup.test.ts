import { describe, expect, it } from 'vitest';
import type { BoardSetup, MountRecipe } from '../schemas/board-setup.schema';
import { EMPTY_SETUP } from '../schemas/board-setup.schema';
import type { BankLine } from '../schemas/rail.schema';
import { type RailSpec, railSpecSchema } from '../schemas/rail-spec.schema';
import { ownMount_H, recipeMount, resolveSpec } from './setup';

const recipe: MountRecipe = {
  id: '00000000-0000-4000-8000-000000000001',
  name: 'short traces',
  trace_length_m: 4e-4,
  trace_width_m: 3e-4,
  via_drill_m: 2e-4,
  via_spacing_m: 1e-3,
  via_pairs: 1,
  coupling: 0,
};
const setup: BoardSetup = {
  stackup: {
    layers: [
      { kind: 'copper', name: 'top', thickness_m: 4e-5, use: 'signal' },
      { kind: 'dielectric', name: 'a', thickness_m: 1e-4, relative_permittivity: 4 },
      { kind: 'copper', name: 'gnd', thickness_m: 2e-5, use: 'plane' },
      { kind: 'dielectric', name: 'b', thickness_m: 2e-4, relative_permittivity: 4.2 },
      { kind: 'copper', name: 'vdd', thickness_m: 2e-5, use: 'plane' },
      { kind: 'dielectric', name: 'c', thickness_m: 1e-3, relative_permittivity: 4 },
      { kind: 'copper', name: 'bottom', thickness_m: 4e-5, use: 'signal' },
    ],
  },
  recipes: [recipe],
};
const spec: RailSpec = railSpecSchema.parse({
  name: 'VDD',
  voltage_V: 1,
  target: { kind: 'flat', impedance_ohm: 0.01 },
  band_Hz: [1e4, 1e7],
  source: { kind: 'open' },
  plane: {
    capacitance_F: 1e-9,
    resistance_ohm: 1e-3,
    inductance_H: 1e-11,
    geometry: {
      length_m: 0.05,
      width_m: 0.04,
      spacing_m: 1e-3,
      relative_permittivity: 1,
      pair: ['gnd', 'vdd'],
    },
  },
});
const line: BankLine = {
  partId: recipe.id,
  count: 1,
  mount_H: null,
  recipeId: recipe.id,
  distance_m: null,
  side: 'top',
  locked: false,
};

describe('a rail on its board', () => {
  it('takes spacing, permittivity and capacitance from the layers it names', () => {
    const { plane } = resolveSpec(spec, setup);
    expect(plane?.geometry).toMatchObject({ spacing_m: 2e-4, relative_permittivity: 4.2, length_m: 0.05 });
    // ε₀·εᵣ·A/h
    expect(plane?.capacitance_F).toBeCloseTo((8.8541878e-12 * 4.2 * 0.05 * 0.04) / 2e-4, 15);
    const plain = { ...spec, plane: undefined };
    expect(resolveSpec(plain, EMPTY_SETUP)).toBe(plain);
  });

  it('says which layer is missing, and that there is no stack-up', () => {
    const gone = { stackup: { layers: setup.stackup?.layers.slice(3) ?? [] }, recipes: [] };
    expect(() => resolveSpec(spec, gone)).toThrow(/gnd/);
    expect(() => resolveSpec(spec, EMPTY_SETUP)).toThrow(
      expect.objectContaining({ field: 'plane.geometry.pair' }),
    );
  });

  it('mounts by recipe as deep as its planes lie from that side', () => {
    const via = (depth_m: number) => 4e-7 * depth_m * Math.acosh(1e-3 / 2e-4);
    const top = recipeMount(recipe, spec, setup, 'top');
    const bottom = recipeMount(recipe, spec, setup, 'bottom');
    expect(top.segments.find((one) => one.part === 'vias')?.inductance_H).toBeCloseTo(via(1e-4), 16);
    expect(bottom.segments.find((one) => one.part === 'vias')?.inductance_H).toBeCloseTo(via(1e-3), 15);
    expect(top.total_H).toBeCloseTo(
      top.segments.reduce((sum, one) => sum + one.inductance_H, 0),
      18,
    );
    expect(ownMount_H(line, spec, setup)).toEqual({ mount_H: top.total_H, recipe: 'short traces' });
  });

  it('lets a typed inductance go before the recipe, and the part’s usual mount stand in for what is not known', () => {
    expect(ownMount_H({ ...line, mount_H: 3e-10 }, spec, setup)).toEqual({ mount_H: 3e-10, recipe: null });
    expect(ownMount_H({ ...line, recipeId: null }, spec, setup)).toBeNull();
    expect(ownMount_H(line, { plane: undefined }, setup)).toBeNull();
    expect(() => recipeMount(recipe, { plane: undefined }, setup, 'top')).toThrow(
      expect.objectContaining({ field: 'recipe' }),
    );
  });
});
