import { zodResolver } from '@hookform/resolvers/zod';
import { cutRevisionSchema } from '@shared/schemas/revision.schema';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Textarea } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { UnsavedGuard } from '@/components/ui/unsaved-guard';
import { messageOf } from '@/lib/problem';
import { showServerFaults } from '@/lib/server-faults';
import { useCutRevision } from '../api/cut-revision';
import type { Draft } from './draft';
import { DraftSummary } from './draft-summary';

interface Props {
  boardId: string;
  draft: Draft;
  onCut: (letter: string) => void;
}

/** Freezes the board as it stands: what changed since, and a note on what the revision is for. */
export function CutRevisionForm({ boardId, draft, onCut }: Props) {
  const cut = useCutRevision(boardId);
  const form = useForm({ resolver: zodResolver(cutRevisionSchema), defaultValues: { note: '' } });
  const { errors, isDirty, isSubmitting } = form.formState;
  if (draft.total === 0) return <p className="text-stone">Add a rail first: there is nothing to cut yet.</p>;
  const submit = form.handleSubmit(({ note }) =>
    cut.mutateAsync({ note }).then(
      (revision) => {
        form.reset({ note: '' });
        onCut(revision.letter);
      },
      (error: unknown) => {
        showServerFaults(error, ['note'], form.setError);
      },
    ),
  );
  return (
    <form noValidate onSubmit={submit} className="grid max-w-4xl gap-x-10 gap-y-4 md:grid-cols-2">
      <DraftSummary draft={draft} />
      <div className="flex flex-col gap-3">
        <Field
          label="note"
          hint="What this revision is for, e.g. for layout start."
          error={errors.note?.message}
        >
          {(control) => <Textarea {...control} rows={3} {...form.register('note')} />}
        </Field>
        {cut.isError && !errors.note && <Notice tone="error">{messageOf(cut.error)}</Notice>}
        <div>
          <Button type="submit" variant="primary" disabled={cut.isPending}>
            {cut.isPending ? 'Cutting …' : `Cut revision ${draft.next}`}
          </Button>
        </div>
      </div>
      <UnsavedGuard dirty={isDirty && !isSubmitting} />
    </form>
  );
}
