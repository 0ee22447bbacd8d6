import type { BoardDetail } from '@shared/schemas/board.schema';
import { type FormEvent, useRef, useState } from 'react';
import { UnsavedGuard } from '@/components/ui/unsaved-guard';
import { usePlace } from '../hooks/use-place';
import { baseOf, useSetupForm } from '../hooks/use-setup-form';
import { useSetupSave } from '../hooks/use-setup-save';
import { faultCount, together } from '../lib/field-faults';
import type { SetupUsage } from '../lib/setup-usage';
import { RecipesPart } from './recipes-part';
import { SaveBar } from './save-bar';
import { SaveTrouble } from './save-trouble';
import { StackupPart } from './stackup-part';

interface Props {
  board: BoardDetail;
  usage: SetupUsage;
  onSaved: (board: BoardDetail) => void;
}

/** What one works on must not lie behind the save bar. */
const CLEAR = '[&_button]:scroll-mb-20 [&_input]:scroll-mb-20 [&_select]:scroll-mb-20';

/** Stack-up and recipes side by side, saved as one. */
export function SetupForm({ board, usage, onSaved }: Props) {
  const canEdit = board.rights.edit;
  const { form, change, base, setup, faults: own, isDirty, restart, keep } = useSetupForm(board);
  const { live, isOld, pairs, place, side, setPairId, setSide } = usePlace(form.layers);
  const [open, setOpen] = useState<string | null>(form.recipes[0]?.id ?? null);
  const element = useRef<HTMLFormElement>(null);
  const save = useSetupSave(board.id, form, (answer) => {
    keep(baseOf(answer));
    onSaved(answer);
  });
  const faults = save.refused ? together(own, save.refused) : own;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (setup) return save.send(setup, base.version);
    const [first] = Object.keys(own.recipes);
    if (first && !(open && own.recipes[open])) setOpen(first);
    requestAnimationFrame(() =>
      element.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus(),
    );
  };
  return (
    <form ref={element} noValidate onSubmit={submit} className={`flex flex-col gap-8 ${CLEAR}`}>
      <div className="grid grid-cols-1 gap-x-14 gap-y-10 min-[1400px]:grid-cols-2">
        <StackupPart {...{ layers: form.layers, faults, live, isOld, pairs, usage, canEdit, change }} />
        <RecipesPart
          {...{ recipes: form.recipes, faults, place, pairs, side, open, usage, canEdit, change }}
          onPair={setPairId}
          onSide={setSide}
          onOpen={setOpen}
        />
      </div>
      <p className="text-small text-stone">
        Estimates from models: measure each rail before release. A part’s own ESL and the path on the planes
        to the load come on top of its mount; the bench adds them.
      </p>
      {canEdit && (
        <>
          <SaveTrouble
            failure={save.failure}
            conflict={save.conflict}
            base={base.setup}
            mine={setup}
            onLoadNewer={(newer) => {
              restart(baseOf(newer));
              onSaved(newer);
              save.reset();
            }}
            onSaveOver={(newer) => setup && save.send(setup, newer.setupVersion)}
          />
          <SaveBar
            isDirty={isDirty}
            isSaving={save.isSaving}
            isSaved={save.isSaved}
            faults={faultCount(faults)}
            onDiscard={() => {
              restart(base);
              save.reset();
            }}
          />
          <UnsavedGuard dirty={isDirty} />
        </>
      )}
    </form>
  );
}
