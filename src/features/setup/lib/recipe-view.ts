import type { MountRecipe } from '@shared/schemas/board-setup.schema';
import { liveRecipe, mountAt, type Place, type PlacedMount } from './recipe-mount';
import type { RecipeForm } from './setup-form';

/** A recipe of the list with what it comes to at the place chosen. */
export interface RecipeView {
  form: RecipeForm;
  /** null: something in it cannot be understood. */
  recipe: MountRecipe | null;
  mount: PlacedMount | null;
  /** Why there is no mount. */
  reason: string | null;
}

export function recipeViews(recipes: readonly RecipeForm[], place: Place | null): RecipeView[] {
  return recipes.map((form) => {
    const recipe = liveRecipe(form);
    if (!recipe) return { form, recipe, mount: null, reason: 'something in it is not right yet' };
    if (!place) return { form, recipe, mount: null, reason: 'needs a plane pair in the stack-up' };
    const answer = mountAt(recipe, place);
    return 'mount' in answer
      ? { form, recipe, mount: answer.mount, reason: null }
      : { form, recipe, mount: null, reason: answer.reason };
  });
}
