import { zodResolver } from '@hookform/resolvers/zod';
import { createBoardSchema } from '@shared/schemas/board.schema';
import type { ReactNode } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input, Textarea } from '@/components/ui/input';
import { UnsavedGuard } from '@/components/ui/unsaved-guard';
import { showServerFaults } from '@/lib/server-faults';

export interface BoardFields {
  name: string;
  description: string;
}

interface Props {
  initial: BoardFields;
  label: string;
  busy: boolean;
  /** Saves; rejects with the server's error, which is then shown at its field. */
  save: (fields: BoardFields) => Promise<unknown>;
  /** Shown above the button: conflicts and other refusals. */
  children?: ReactNode;
}

/** Name and description of a board. */
export function BoardForm({ initial, label, busy, save, children }: Props) {
  const form = useForm({ resolver: zodResolver(createBoardSchema), defaultValues: initial });
  const { errors, isDirty, isSubmitting } = form.formState;
  const submit = form.handleSubmit(({ name, description }) =>
    save({ name, description }).then(
      () => form.reset({ name, description }),
      (error: unknown) => {
        showServerFaults(error, ['name', 'description'], form.setError);
      },
    ),
  );
  return (
    <form noValidate className="flex max-w-xl flex-col gap-4" onSubmit={submit}>
      <Field label="name" hint="As your team calls it, e.g. Tide gateway." error={errors.name?.message}>
        {(control) => <Input {...control} {...form.register('name')} />}
      </Field>
      <Field
        label="description (may stay empty)"
        hint="What it is, which project, anything a reviewer should know."
        error={errors.description?.message}
      >
        {(control) => <Textarea {...control} rows={3} {...form.register('description')} />}
      </Field>
      {children}
      <div>
        <Button type="submit" variant="primary" disabled={busy}>
          {busy ? 'Saving …' : label}
        </Button>
      </div>
      <UnsavedGuard dirty={isDirty && !isSubmitting} />
    </form>
  );
}
