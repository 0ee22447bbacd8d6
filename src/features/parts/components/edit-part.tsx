import { type Part, type PartFields, partFieldsSchema, partSchema } from '@shared/schemas/part.schema';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { Notice } from '@/components/ui/notice';
import { conflictOf } from '@/lib/conflict';
import { ApiError, messageOf } from '@/lib/problem';
import { takePart } from '../api/part';
import { useUpdatePart } from '../api/update-part';
import { partFormInput } from '../lib/part-form.schema';
import { PartForm } from './part-form';

const NAMES = Object.keys(partFieldsSchema.shape) as (keyof PartFields)[];

/** By what they say: curves are lists, and two lists are never the same object. */
const differs = (a: unknown, b: unknown): boolean => JSON.stringify(a) !== JSON.stringify(b);

interface Props {
  part: Part;
  onDone: () => void;
}

/** Edits a part; a save that met a newer state keeps what was typed and offers both ways on. */
export function EditPart({ part, onDone }: Props) {
  const client = useQueryClient();
  const update = useUpdatePart(part.id);
  const [base, setBase] = useState(part);
  const save = (fields: PartFields, version: number) =>
    update.mutateAsync({ ...fields, version }).then(onDone);
  const conflict = conflictOf(update.error, partSchema);
  const typed = update.variables;
  const isAtField = update.error instanceof ApiError && update.error.problem.errors !== undefined;
  return (
    <PartForm
      key={base.version}
      initial={partFormInput(base)}
      label="Save"
      busy={update.isPending}
      save={(fields) => save(fields, base.version)}
      onCancel={onDone}
    >
      {conflict && typed ? (
        <ConflictNotice
          what="this part"
          changedBy={conflict.changedBy}
          changedAt={conflict.changedAt}
          differing={NAMES.filter((name) => differs(typed[name], conflict.current[name]))}
          onLoadNewer={() => {
            void takePart(client, conflict.current);
            setBase(conflict.current);
            update.reset();
          }}
          onSaveOver={() => {
            void save(partFieldsSchema.strip().parse(typed), conflict.current.version).catch(() => undefined);
          }}
        />
      ) : (
        update.isError && !isAtField && <Notice tone="error">{messageOf(update.error)}</Notice>
      )}
    </PartForm>
  );
}
