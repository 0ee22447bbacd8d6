import { useParams, useSearchParams } from 'react-router-dom';
import { ButtonLink } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { PlacementPage } from '@/features/placement/components/placement-page';
import { useRevision } from '@/features/revisions/api/revision';
import { useRevisions } from '@/features/revisions/api/revisions';
import { usePageTitle } from '@/lib/use-page-title';

function NoRevision({ boardId, boardName, mayCut }: { boardId: string; boardName: string; mayCut: boolean }) {
  usePageTitle('Placement', boardName);
  return (
    <Page title="Placement">
      <EmptyState
        title="No revision yet"
        action={mayCut && <ButtonLink to={paths.revisions(boardId)}>To the revisions</ButtonLink>}
      >
        A placement list is made from a revision, so that layout never works from a draft that still moves.
        {mayCut ? ' Cut one first.' : ' The engineers of this board have not cut one.'}
      </EmptyState>
    </Page>
  );
}

export function Component() {
  const { boardId = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const board = useBoard(boardId);
  const revisions = useRevisions(boardId);
  const letter = search.get('revision') ?? revisions.data?.items[0]?.letter;
  const detail = useRevision(boardId, letter);
  if (board.isError) return <Failure error={board.error} what="the board" retry={() => board.refetch()} />;
  if (revisions.isError)
    return <Failure error={revisions.error} what="the revisions" retry={() => revisions.refetch()} />;
  if (board.isPending || revisions.isPending) return <Loading what="the revisions" />;
  if (letter === undefined)
    return <NoRevision boardId={boardId} boardName={board.data.name} mayCut={board.data.rights.edit} />;
  if (detail.isError)
    return (
      <Failure
        error={detail.error}
        what={`revision ${letter}`}
        retry={() => detail.refetch()}
        back={{ to: paths.revisions(boardId), text: 'To the revisions' }}
      />
    );
  if (detail.isPending) return <Loading what={`revision ${letter}`} />;
  return (
    <PlacementPage
      boardName={board.data.name}
      revisions={revisions.data.items}
      detail={detail.data}
      csvHref={`/api/boards/${boardId}/revisions/${letter}/placement.csv`}
      onChoose={(chosen) => setSearch({ revision: chosen })}
    />
  );
}
