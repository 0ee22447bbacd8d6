import { Facts } from '@/components/ui/facts';
import { Failure } from '@/components/ui/failure';
import { Loading, Page, Section } from '@/components/ui/page';
import { usePageTitle } from '@/lib/use-page-title';
import { useBoard } from '../api/boards';
import { AddMember } from './add-member';
import { BoardSettings } from './board-settings';
import { DeleteBoard } from './delete-board';
import { MembersTable } from './members-table';
import { myRoleText, peoplePageTitle, ROLE_RIGHTS, ROLES } from './role-words';

/** Who is on the board; for its owner also its name, description and end. */
export function BoardPeoplePage({ boardId, onDeleted }: { boardId: string; onDeleted: () => void }) {
  const query = useBoard(boardId);
  const title = peoplePageTitle(query.data?.rights.manage ?? false);
  usePageTitle(title, query.data?.name);
  if (query.isPending) return <Loading what="the board’s people" />;
  if (query.isError)
    return <Failure error={query.error} what="the board’s people" retry={() => query.refetch()} />;
  const board = query.data;
  const { manage } = board.rights;
  return (
    <Page
      title={title}
      lead={
        manage
          ? 'You own this board and choose who is on it.'
          : `${board.owner.name} owns this board and chooses who is on it. You are ${myRoleText(board)}.`
      }
      narrow
    >
      <MembersTable board={board} />
      {manage && (
        <Section title="add a person">
          <AddMember board={board} />
        </Section>
      )}
      <Section title="what each role may do" className="border-t pt-5">
        <Facts rows={ROLES.map((role) => [role, ROLE_RIGHTS[role]])} />
      </Section>
      {manage && (
        <>
          <Section title="the board" className="border-t pt-5">
            <BoardSettings board={board} />
          </Section>
          <Section title="end of the board" className="border-t pt-5">
            <DeleteBoard board={board} onDeleted={onDeleted} />
          </Section>
        </>
      )}
    </Page>
  );
}
