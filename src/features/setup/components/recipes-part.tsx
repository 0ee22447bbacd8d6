import { Button } from '@/components/ui/button';
import { Section } from '@/components/ui/page';
import type { ChangeForm } from '../hooks/use-setup-form';
import type { FieldFaults } from '../lib/field-faults';
import type { PairFigures } from '../lib/pair-figures';
import type { Place, Side } from '../lib/recipe-mount';
import { duplicateRecipe, newRecipe } from '../lib/recipe-rows';
import { recipeViews } from '../lib/recipe-view';
import type { RecipeForm } from '../lib/setup-form';
import type { SetupUsage } from '../lib/setup-usage';
import { NoRecipes } from './no-recipes';
import { PlaceChoice } from './place-choice';
import { RecipeEditor } from './recipe-editor';
import { RecipeList } from './recipe-list';

interface Props {
  recipes: RecipeForm[];
  faults: FieldFaults;
  place: Place | null;
  pairs: readonly PairFigures[];
  side: Side;
  onPair: (id: string) => void;
  onSide: (side: Side) => void;
  open: string | null;
  onOpen: (id: string | null) => void;
  usage: SetupUsage;
  canEdit: boolean;
  change: ChangeForm;
}

/** The mount recipes: what each comes to at one place on the board, and one of them opened. */
export function RecipesPart(props: Props) {
  const { recipes, faults, place, open, onOpen, usage, canEdit } = props;
  const set = (next: (recipes: RecipeForm[]) => RecipeForm[]) =>
    props.change((form) => ({ ...form, recipes: next(form.recipes) }));
  const patch = (id: string, change: Partial<RecipeForm>) =>
    set((all) => all.map((recipe) => (recipe.id === id ? { ...recipe, ...change } : recipe)));
  const add = () => {
    const recipe = newRecipe(recipes);
    set((all) => [...all, recipe]);
    onOpen(recipe.id);
  };
  const duplicate = (id: string) => {
    const [next, copy] = duplicateRecipe(recipes, id);
    set(() => next);
    onOpen(copy);
  };
  if (recipes.length === 0)
    return (
      <Section title="mount recipes">
        <NoRecipes canEdit={canEdit} onAdd={add} />
      </Section>
    );
  const views = recipeViews(recipes, place);
  const shown = views.find(({ form }) => form.id === open && !form.removed);
  return (
    <Section title="mount recipes" className="min-w-0">
      <div className="grid grid-cols-1 gap-x-14 gap-y-6 min-[1180px]:max-[1399px]:grid-cols-2">
        <div className="flex min-w-0 flex-col gap-4">
          <PlaceChoice
            pairs={props.pairs}
            pair={place?.pair ?? null}
            side={props.side}
            onPair={props.onPair}
            onSide={props.onSide}
          />
          <div>
            <RecipeList
              views={views}
              usage={usage}
              open={shown?.form.id ?? null}
              faulty={new Set(Object.keys(faults.recipes))}
              onOpen={onOpen}
              onPutBack={(id) => patch(id, { removed: false })}
            />
            {faults.recipeList.map((fault) => (
              <p key={fault} role="alert" className="mt-2 text-kingfisher">
                ▲ {fault}
              </p>
            ))}
            {canEdit && (
              <Button variant="plain" className="mt-1" onClick={add}>
                + add a recipe
              </Button>
            )}
          </div>
        </div>
        {shown && (
          <div className="min-w-0 border-t pt-4 min-[1180px]:max-[1399px]:border-t-0 min-[1180px]:max-[1399px]:pt-0">
            <RecipeEditor
              key={shown.form.id}
              view={shown}
              place={place}
              faults={faults.recipes[shown.form.id]}
              edit={
                canEdit
                  ? {
                      onChange: (change) => patch(shown.form.id, change),
                      onDuplicate: () => duplicate(shown.form.id),
                      onRemove: () => patch(shown.form.id, { removed: true }),
                    }
                  : null
              }
            />
          </div>
        )}
      </div>
    </Section>
  );
}
