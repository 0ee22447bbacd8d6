import type { BoardDetail } from '@shared/schemas/board.schema';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { messageOf } from '@/lib/problem';
import { useDeleteBoard } from '../api/boards';

/** Deleting a board takes its rails and revisions with it, so its name must be typed. */
export function DeleteBoard({ board, onDeleted }: { board: BoardDetail; onDeleted: () => void }) {
  const [open, setOpen] = useState(false);
  const [typed, setTyped] = useState('');
  const remove = useDeleteBoard(board.id);
  const isSure = typed.trim() === board.name;
  return (
    <>
      <Button variant="danger" onClick={() => setOpen(true)}>
        Delete this board …
      </Button>
      <Dialog title={`Delete ${board.name}?`} open={open} onClose={() => setOpen(false)}>
        <p>
          Its {board.rails.total} {board.rails.total === 1 ? 'rail' : 'rails'}, all revisions and its list of
          people go with it. This cannot be undone.
        </p>
        <form
          className="flex flex-col gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            if (isSure) remove.mutate(board.version, { onSuccess: onDeleted });
          }}
        >
          <Field label={`type the name of the board: ${board.name}`}>
            {(control) => (
              <Input {...control} value={typed} onChange={(event) => setTyped(event.target.value)} />
            )}
          </Field>
          {remove.isError && <Notice tone="error">{messageOf(remove.error)}</Notice>}
          <div className="flex gap-3">
            <Button type="submit" variant="danger" disabled={!isSure || remove.isPending}>
              {remove.isPending ? 'Deleting …' : 'Delete for good'}
            </Button>
            <Button onClick={() => setOpen(false)}>Keep it</Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
