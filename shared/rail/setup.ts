import { EngineError } from '../engine/errors';
import { mountInductance } from '../engine/inductance/mount';
import { heightToPlane, planePair } from '../engine/inductance/stackup';
import { planeCapacitance } from '../engine/plane';
import type { BoardSetup, MountRecipe } from '../schemas/board-setup.schema';
import type { RailSpec } from '../schemas/rail-spec.schema';

/**
 * A rail's planes follow the board's stack-up: where they name a pair of its layers, spacing, permittivity and capacitance are
 * taken from there. Throws EngineError naming the layer that the stack-up lacks.
 */
export function resolveSpec(spec: RailSpec, setup: BoardSetup): RailSpec {
  const geometry = spec.plane?.geometry;
  if (!spec.plane || !geometry?.pair) return spec;
  if (!setup.stackup)
    throw new EngineError(
      'plane.geometry.pair',
      'the planes are to come from a stack-up, and the board has none',
    );
  const { spacing_m, relative_permittivity } = planePair(setup.stackup.layers, ...geometry.pair);
  const capacitance_F = planeCapacitance(
    geometry.length_m,
    geometry.width_m,
    spacing_m,
    relative_permittivity,
  );
  return {
    ...spec,
    plane: { ...spec.plane, capacitance_F, geometry: { ...geometry, spacing_m, relative_permittivity } },
  };
}

export type Mount = ReturnType<typeof mountInductance>;

/**
 * What a recipe comes to on a rail: traces over the plane nearest to that side, vias down to the rail's nearer plane. Throws
 * EngineError where the rail's planes are not taken from the stack-up, since then nobody knows how deep the vias go.
 */
export function recipeMount(
  recipe: MountRecipe,
  spec: Pick<RailSpec, 'plane'>,
  setup: BoardSetup,
  side: 'top' | 'bottom',
): Mount {
  const pair = spec.plane?.geometry?.pair;
  if (!setup.stackup || !pair)
    throw new EngineError(
      'recipe',
      'a recipe needs the rail’s planes from the stack-up: choose the pair in its specification',
    );
  const { depthFromTop_m, depthFromBottom_m } = planePair(setup.stackup.layers, ...pair);
  return mountInductance(recipe, {
    traceHeight_m: heightToPlane(setup.stackup.layers, side),
    viaDepth_m: side === 'top' ? depthFromTop_m : depthFromBottom_m,
  });
}

/** A line's mount where it has one of its own: typed in, or from its recipe; null: the part's usual one. */
export function ownMount_H(
  line: { mount_H: number | null; recipeId: string | null; side: 'top' | 'bottom' },
  spec: Pick<RailSpec, 'plane'>,
  setup: BoardSetup,
): { mount_H: number; recipe: string | null } | null {
  if (line.mount_H !== null) return { mount_H: line.mount_H, recipe: null };
  const recipe = setup.recipes.find((one) => one.id === line.recipeId);
  if (!recipe || !setup.stackup || !spec.plane?.geometry?.pair) return null;
  return { mount_H: recipeMount(recipe, spec, setup, line.side).total_H, recipe: recipe.name };
}
