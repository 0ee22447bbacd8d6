import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { useLastGood } from '../hooks/use-last-good';
import type { FieldFaults } from '../lib/field-faults';
import { inductanceText } from '../lib/inductance-text';
import { mountAt, type Place } from '../lib/recipe-mount';
import type { RecipeView } from '../lib/recipe-view';
import type { RecipeForm } from '../lib/setup-form';
import { Formulas } from './formulas';
import { RecipeDrawings } from './recipe-drawings';
import { RecipeFacts } from './recipe-facts';
import { RecipeFields } from './recipe-fields';
import { SplitBar } from './split-bar';

interface Props {
  view: RecipeView;
  place: Place | null;
  faults: FieldFaults['recipes'][string] | undefined;
  /** null: to be looked at only. */
  edit: {
    onChange: (patch: Partial<RecipeForm>) => void;
    onDuplicate: () => void;
    onRemove: () => void;
  } | null;
}

/** One recipe opened: its geometry, drawn while one types, and what each part of its loop costs. */
export function RecipeEditor({ view, place, faults, edit }: Props) {
  const { form, reason } = view;
  const { good: recipe, isOld } = useLastGood(view.recipe);
  const answer = recipe && place ? mountAt(recipe, place) : null;
  const mount = answer && 'mount' in answer ? answer.mount : null;
  return (
    <section aria-label={`recipe ${form.name}`} className="flex min-w-0 flex-col gap-5">
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        {edit ? (
          <div className="min-w-[16rem] flex-1">
            <Field label="name of the recipe" error={faults?.name}>
              {(control) => (
                <Input
                  {...control}
                  name="name"
                  className="font-semibold"
                  value={form.name}
                  onChange={(event) => edit.onChange({ name: event.target.value })}
                />
              )}
            </Field>
          </div>
        ) : (
          <h3 className="font-semibold">{form.name}</h3>
        )}
        {edit && (
          <div className="flex gap-5">
            <Button variant="plain" onClick={edit.onDuplicate}>
              Duplicate
            </Button>
            <Button variant="plain" className="text-kingfisher" onClick={edit.onRemove}>
              Remove
            </Button>
          </div>
        )}
      </div>
      {recipe && (
        <RecipeDrawings recipe={recipe} place={place} mount={mount} isOld={isOld}>
          {edit ? (
            <RecipeFields form={form} faults={faults} onChange={edit.onChange} />
          ) : (
            <RecipeFacts recipe={recipe} />
          )}
        </RecipeDrawings>
      )}
      {mount ? (
        <div className="flex flex-col gap-3">
          <p aria-live="polite">
            <span className="text-large font-semibold" data-testid="mount-inductance">
              {inductanceText(mount.total_H)}
            </span>{' '}
            <span className="text-stone">of mounting inductance{isOld && ', as last understood'}</span>
          </p>
          <SplitBar mount={mount} />
          <Formulas mount={mount} />
        </div>
      ) : (
        <p className="text-stone">No inductance yet: {reason}.</p>
      )}
    </section>
  );
}
