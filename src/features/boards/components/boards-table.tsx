import type { BoardSummary } from '@shared/schemas/board.schema';
import { RailTally } from '@/components/ui/rail-tally';
import { Table, Td, Th } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { dayOf } from '@/lib/time';
import { myRoleText } from './role-words';

const HEAD = (
  <>
    <Th>board</Th>
    <Th>rails</Th>
    <Th>latest revision</Th>
    <Th>changed since</Th>
    <Th>my role</Th>
    <Th>updated</Th>
  </>
);

function changedText({ latestRevision, changedRails, rails }: BoardSummary): string {
  if (!latestRevision) return rails.total === 0 ? '—' : 'never cut';
  return changedRails === 0 ? 'nothing' : `${changedRails} ${changedRails === 1 ? 'rail' : 'rails'}`;
}

function Row({ board }: { board: BoardSummary }) {
  const { latestRevision } = board;
  return (
    <tr className="hover:bg-wash/50">
      <Td className="min-w-56 py-2.5">
        <TextLink to={paths.board(board.id)} className="font-semibold">
          {board.name}
        </TextLink>
        {board.description && (
          <span className="mt-0.5 line-clamp-2 max-w-[52ch] text-small text-stone">{board.description}</span>
        )}
      </Td>
      <Td>
        <RailTally rails={board.rails} />
      </Td>
      <Td className="whitespace-nowrap">
        {latestRevision ? (
          <>
            <TextLink to={paths.revision(board.id, latestRevision.letter)}>{latestRevision.letter}</TextLink>
            <span className="text-stone"> · {dayOf(latestRevision.createdAt)}</span>
          </>
        ) : (
          <span className="text-stone">none</span>
        )}
      </Td>
      <Td className="whitespace-nowrap">{changedText(board)}</Td>
      <Td className="whitespace-nowrap">{myRoleText(board)}</Td>
      <Td className="whitespace-nowrap text-stone">{dayOf(board.updatedAt)}</Td>
    </tr>
  );
}

/** One row a board. */
export function BoardsTable({ boards }: { boards: readonly BoardSummary[] }) {
  return (
    <Table caption="boards" head={HEAD}>
      {boards.map((board) => (
        <Row key={board.id} board={board} />
      ))}
    </Table>
  );
}
