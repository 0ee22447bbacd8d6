import type { BoardSetup, Layer, MountRecipe } from '@shared/schemas/board-setup.schema';
import { lengthText, thicknessText } from './length-text';
import { newId } from './new-id';

export type LayerKind = 'signal' | 'plane' | 'dielectric';

/** A layer as it is typed: text everywhere, so that nothing typed is ever lost. */
export interface LayerForm {
  key: string;
  name: string;
  kind: LayerKind;
  thickness: string;
  /** Kept while the layer is copper, so that it is there again when it is made a dielectric. */
  permittivity: string;
}

export interface RecipeForm {
  id: string;
  name: string;
  traceLength: string;
  traceWidth: string;
  drill: string;
  spacing: string;
  pairs: string;
  coupling: string;
  /** Goes with the next save; until then it can be put back. */
  removed: boolean;
}

export interface SetupForm {
  /** null: the board has no stack-up. */
  layers: LayerForm[] | null;
  recipes: RecipeForm[];
}

export const USUAL_PERMITTIVITY = '4.2';

export const layerForm = (layer: Layer): LayerForm => ({
  key: newId(),
  name: layer.name,
  kind: layer.kind === 'copper' ? layer.use : 'dielectric',
  thickness: thicknessText(layer.thickness_m),
  permittivity: layer.kind === 'dielectric' ? String(layer.relative_permittivity) : USUAL_PERMITTIVITY,
});

export const recipeForm = (recipe: MountRecipe): RecipeForm => ({
  id: recipe.id,
  name: recipe.name,
  traceLength: lengthText(recipe.trace_length_m),
  traceWidth: lengthText(recipe.trace_width_m),
  drill: lengthText(recipe.via_drill_m),
  spacing: lengthText(recipe.via_spacing_m),
  pairs: String(recipe.via_pairs),
  coupling: String(recipe.coupling),
  removed: false,
});

/** The form that reads back as `setup`. */
export const formOf = (setup: BoardSetup): SetupForm => ({
  layers: setup.stackup?.layers.map(layerForm) ?? null,
  recipes: setup.recipes.map(recipeForm),
});
