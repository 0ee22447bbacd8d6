import { useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Failure } from '@/components/ui/failure';
import { Loading } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { Bench } from '@/features/bench/components/bench';
import { useBoard } from '@/features/boards/api/boards';
import { cacheRail, cacheResult, useRail } from '@/features/rails/api/rails';
import { useSession } from '@/features/session/api/session';
import { isGone } from '@/lib/problem';
import { usePageTitle } from '@/lib/use-page-title';
import { HeaderStatus } from '../layouts/status-slot';

export function Component() {
  const { boardId = '', railId = '' } = useParams();
  const client = useQueryClient();
  const { data: session } = useSession();
  const board = useBoard(boardId);
  const rail = useRail(boardId, railId);
  usePageTitle(rail.data?.rail.spec.name ?? 'Bench', board.data?.name);
  if (board.isError && !board.data)
    return <Failure error={board.error} what="the board" retry={() => void board.refetch()} />;
  if (rail.isError && (!rail.data || isGone(rail.error)))
    return (
      <Failure
        error={rail.error}
        what="the rail"
        retry={() => void rail.refetch()}
        back={{ to: paths.board(boardId), text: 'To the board' }}
      />
    );
  if (!rail.data || !board.data || !session) return <Loading what="the rail" />;
  const { latestRevision, rights } = board.data;
  return (
    <Bench
      key={railId}
      server={rail.data}
      setup={board.data.setup}
      personId={session.person.id}
      canEdit={rights.edit}
      editTo={rights.edit ? paths.specification(boardId, railId) : null}
      onSaved={(answer) => {
        cacheRail(client, answer);
        void client.invalidateQueries({ queryKey: ['boards'], exact: true });
      }}
      onResult={(result) => cacheResult(client, boardId, railId, result)}
      renderStatus={(status) => (
        <HeaderStatus>
          {rights.edit ? (latestRevision ? `draft after ${latestRevision.letter}` : 'draft') : 'read only'} ·{' '}
          {status}
        </HeaderStatus>
      )}
    />
  );
}
