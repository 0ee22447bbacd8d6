import { EngineError } from '@shared/engine/errors';
import { type Mount, mountInductance } from '@shared/engine/inductance/mount';
import { heightToPlane } from '@shared/engine/inductance/stackup';
import { type MountRecipe, mountRecipeSchema } from '@shared/schemas/board-setup.schema';
import type { LiveLayer } from './live-layers';
import type { PairFigures } from './pair-figures';
import { readRecipe } from './read-setup';
import type { RecipeForm } from './setup-form';

export type Side = 'top' | 'bottom';

/** Where recipes are looked at: a side of the board and a plane pair that the vias go to. */
export interface Place {
  layers: readonly LiveLayer[];
  pair: PairFigures;
  side: Side;
}

/** The geometry in the form; null while a number of it cannot be understood or used. Its name does not matter here. */
export function liveRecipe(form: RecipeForm): MountRecipe | null {
  const read = readRecipe({ ...form, name: 'any' }, '', (_, parsed) =>
    parsed.ok ? parsed.value : Number.NaN,
  );
  const checked = mountRecipeSchema.safeParse(read);
  return checked.success ? checked.data : null;
}

export interface PlacedMount extends Mount {
  traceHeight_m: number;
  viaDepth_m: number;
}

/** What a recipe comes to there, or why it cannot be said. */
export function mountAt(
  recipe: MountRecipe,
  { layers, pair, side }: Place,
): { mount: PlacedMount } | { reason: string } {
  try {
    const traceHeight_m = heightToPlane(layers, side);
    const viaDepth_m = side === 'top' ? pair.depthFromTop_m : pair.depthFromBottom_m;
    const mount = mountInductance(recipe, { traceHeight_m, viaDepth_m });
    return { mount: { ...mount, traceHeight_m, viaDepth_m } };
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    return { reason: error.message };
  }
}
