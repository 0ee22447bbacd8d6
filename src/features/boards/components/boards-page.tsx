import { ButtonLink } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { usePageTitle } from '@/lib/use-page-title';
import { useBoards } from '../api/boards';
import { BoardsTable } from './boards-table';

const NEW = (
  <ButtonLink to={paths.newBoard()} variant="primary">
    New board
  </ButtonLink>
);

export function BoardsPage() {
  usePageTitle('Boards');
  const boards = useBoards();
  if (boards.isPending) return <Loading what="the boards" />;
  if (boards.isError)
    return <Failure error={boards.error} what="the boards" retry={() => boards.refetch()} />;
  const { items, total } = boards.data;
  if (items.length === 0)
    return (
      <Page title="Boards">
        <EmptyState title="No boards yet" action={NEW}>
          A board is one project: a circuit board with its rails, people and revisions. Make one and add its
          first rail, or ask the owner of a board to add you to it.
        </EmptyState>
      </Page>
    );
  return (
    <Page title="Boards" actions={NEW}>
      <BoardsTable boards={items} />
      {total > items.length && (
        <p className="text-stone">
          The first {items.length} of {total} boards, by name.
        </p>
      )}
    </Page>
  );
}
