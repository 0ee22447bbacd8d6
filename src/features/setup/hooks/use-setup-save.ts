import { type BoardDetail, boardDetailSchema } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { useState } from 'react';
import { conflictOf } from '@/lib/conflict';
import { ApiError } from '@/lib/problem';
import { useSaveSetup } from '../api/save-setup';
import { type FieldFaults, faultsAtFields } from '../lib/field-faults';
import type { SetupForm } from '../lib/setup-form';

/** Saves what was read from the form and keeps what the server said about it, until the form is changed. */
export function useSetupSave(boardId: string, form: SetupForm, onSaved: (board: BoardDetail) => void) {
  const save = useSaveSetup(boardId);
  const [sent, setSent] = useState<SetupForm | null>(null);
  // What was refused holds for what was sent; the next edit may have mended it.
  const said = save.error instanceof ApiError && sent === form ? save.error.problem.errors : undefined;
  const refused: FieldFaults | null = said ? faultsAtFields(form, said) : null;
  const conflict = conflictOf(save.error, boardDetailSchema);
  const isAtField = refused !== null && refused.other.length === 0;
  return {
    refused,
    conflict,
    isSaving: save.isPending,
    isSaved: save.isSuccess,
    /** What no field and no conflict says. */
    failure: conflict || isAtField ? null : save.error,
    reset: save.reset,
    send: (setup: BoardSetup, version: number) => {
      setSent(form);
      save.mutate({ version, setup }, { onSuccess: onSaved });
    },
  };
}
