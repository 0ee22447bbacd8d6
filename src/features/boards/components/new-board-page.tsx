import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { ApiError, messageOf } from '@/lib/problem';
import { usePageTitle } from '@/lib/use-page-title';
import { useCreateBoard } from '../api/boards';
import { BoardForm } from './board-form';

export function NewBoardPage({ onCreated }: { onCreated: (boardId: string) => void }) {
  usePageTitle('New board');
  const create = useCreateBoard();
  const isAtField = create.error instanceof ApiError && create.error.problem.errors !== undefined;
  return (
    <Page
      title="New board"
      lead="You will own it, be one of its engineers, and choose who else is on it."
      narrow
    >
      <BoardForm
        initial={{ name: '', description: '' }}
        label="Make the board"
        busy={create.isPending}
        save={(fields) => create.mutateAsync(fields).then((board) => onCreated(board.id))}
      >
        {create.isError && !isAtField && <Notice tone="error">{messageOf(create.error)}</Notice>}
      </BoardForm>
    </Page>
  );
}
