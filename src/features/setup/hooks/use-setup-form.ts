import type { BoardDetail } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { useMemo, useState } from 'react';
import { type FieldFaults, faultsAtFields, NO_FAULTS } from '../lib/field-faults';
import { readSetup } from '../lib/read-setup';
import { formOf, type SetupForm } from '../lib/setup-form';

/** What a form starts from: a save names the version, and what is the same as `setup` has not been changed. */
export interface Base {
  setup: BoardSetup;
  version: number;
}

export const baseOf = (board: Pick<BoardDetail, 'setup' | 'setupVersion'>): Base => ({
  setup: board.setup,
  version: board.setupVersion,
});

export type ChangeForm = (change: (form: SetupForm) => SetupForm) => void;

/** The form's text, what it reads as, and whether that differs from what is stored. */
export function useSetupForm(board: BoardDetail) {
  const [base, setBase] = useState(() => baseOf(board));
  const [form, setForm] = useState(() => formOf(board.setup));
  const answer = useMemo(() => readSetup(form), [form]);
  const setup = 'setup' in answer ? answer.setup : null;
  const isDirty = setup === null || JSON.stringify(setup) !== JSON.stringify(base.setup);
  const restart = (next: Base) => {
    setBase(next);
    setForm(formOf(next.setup));
  };
  // Nothing typed is at stake: somebody else's newer state may come in.
  if (!isDirty && board.setupVersion > base.version) restart(baseOf(board));
  const faults: FieldFaults = useMemo(
    () => ('faults' in answer ? faultsAtFields(form, answer.faults) : NO_FAULTS),
    [answer, form],
  );
  const change: ChangeForm = setForm;
  return {
    form,
    change,
    base,
    setup,
    faults,
    isDirty,
    restart,
    /** After a save: what is stored now is what was typed, and the text stays as it was typed. */
    keep: (next: Base) => {
      setBase(next);
      setForm((now) => ({ ...now, recipes: now.recipes.filter((recipe) => !recipe.removed) }));
    },
  };
}
