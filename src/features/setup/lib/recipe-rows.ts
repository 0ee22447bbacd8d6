import { freeName } from './layer-rows';
import { newId } from './new-id';
import type { RecipeForm } from './setup-form';

const namesOf = (recipes: readonly RecipeForm[]) => recipes.map((recipe) => recipe.name);

/** A plausible mount to begin with: one pair of vias on short traces. */
export const newRecipe = (recipes: readonly RecipeForm[]): RecipeForm => ({
  id: newId(),
  name: freeName('new recipe', namesOf(recipes)),
  traceLength: '0.4 mm',
  traceWidth: '0.3 mm',
  drill: '0.2 mm',
  spacing: '0.9 mm',
  pairs: '1',
  coupling: '0',
  removed: false,
});

const MOST_NAME = 80;

/** The same mount under another name, right after its pattern. */
export function duplicateRecipe(recipes: readonly RecipeForm[], id: string): [RecipeForm[], string] {
  const at = recipes.findIndex((recipe) => recipe.id === id);
  const pattern = recipes[at];
  const name = freeName(`${pattern.name.slice(0, MOST_NAME - 10)} copy`, namesOf(recipes));
  const copy = { ...pattern, id: newId(), name, removed: false };
  return [recipes.toSpliced(at + 1, 0, copy), copy.id];
}
