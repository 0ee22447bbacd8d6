import { type BoardDetail, boardDetailSchema } from '@shared/schemas/board.schema';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { Notice } from '@/components/ui/notice';
import { conflictOf } from '@/lib/conflict';
import { ApiError, messageOf } from '@/lib/problem';
import { boardQuery, useUpdateBoard } from '../api/boards';
import { type BoardFields, BoardForm } from './board-form';

/** Edits name and description; a save that met a newer state says so and offers both ways on. */
export function BoardSettings({ board }: { board: BoardDetail }) {
  const client = useQueryClient();
  const update = useUpdateBoard(board.id);
  // The state the form started from: a newer one arriving in the background must not swallow what is typed.
  const [base, setBase] = useState(board);
  const save = (fields: BoardFields, version: number) =>
    update.mutateAsync({ version, ...fields }).then((saved) => setBase({ ...saved, ...fields }));
  const conflict = conflictOf(update.error, boardDetailSchema);
  const typed = update.variables;
  const isAtField = update.error instanceof ApiError && update.error.problem.errors !== undefined;
  return (
    <BoardForm
      key={base.version}
      initial={{ name: base.name, description: base.description }}
      label="Save"
      busy={update.isPending}
      save={(fields) => save(fields, base.version)}
    >
      {conflict && typed ? (
        <ConflictNotice
          what="this board"
          changedBy={conflict.changedBy}
          changedAt={conflict.changedAt}
          differing={(['name', 'description'] as const).filter((key) => typed[key] !== conflict.current[key])}
          onLoadNewer={() => {
            client.setQueryData(boardQuery(board.id).queryKey, conflict.current);
            setBase(conflict.current);
            update.reset();
          }}
          onSaveOver={() => {
            void save(
              { name: typed.name ?? base.name, description: typed.description ?? base.description },
              conflict.current.version,
            ).catch(() => undefined);
          }}
        />
      ) : (
        update.isError && !isAtField && <Notice tone="error">{messageOf(update.error)}</Notice>
      )}
      {update.isSuccess && (
        <p role="status" className="text-reed">
          ▽ Saved.
        </p>
      )}
    </BoardForm>
  );
}
