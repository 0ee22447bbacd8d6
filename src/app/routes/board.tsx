import { useParams } from 'react-router-dom';
import { ButtonLink } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { EmptyState, Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { useRails } from '@/features/rails/api/rails';
import { RailsTable } from '@/features/rails/components/rails-table';
import { dayOf } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';

export function Component() {
  const { boardId = '' } = useParams();
  const board = useBoard(boardId);
  const rails = useRails(boardId);
  usePageTitle(board.data?.name ?? 'Board');
  if (board.isError && !board.data)
    return <Failure error={board.error} what="the board" retry={() => void board.refetch()} />;
  if (rails.isError && !rails.data)
    return <Failure error={rails.error} what="the rails" retry={() => void rails.refetch()} />;
  if (!board.data || !rails.data) return <Loading what="the board" />;
  const { rights, latestRevision, changedRails, description, name } = board.data;
  const list = rails.data.rails;
  return (
    <Page
      title={name}
      lead={
        <>
          {description && <p>{description}</p>}
          <p>
            {latestRevision
              ? `Revision ${latestRevision.letter} was cut on ${dayOf(latestRevision.createdAt)}; ${changedRails === 0 ? 'no rail has' : `${changedRails} ${changedRails === 1 ? 'rail has' : 'rails have'}`} changed since.`
              : 'No revision has been cut yet.'}
          </p>
        </>
      }
      actions={
        rights.edit && (
          <>
            <ButtonLink to={paths.revisions(boardId)}>Cut a revision</ButtonLink>
            <ButtonLink to={paths.newRail(boardId)} variant="primary">
              Add a rail
            </ButtonLink>
          </>
        )
      }
    >
      {list.length === 0 ? (
        <EmptyState
          title="This board has no rails yet"
          action={
            rights.edit && (
              <ButtonLink to={paths.newRail(boardId)} variant="primary">
                Add the first rail
              </ButtonLink>
            )
          }
        >
          A rail is a supply with a target impedance over a band of frequencies. Describe one, then size its
          bank on the bench.
        </EmptyState>
      ) : (
        <RailsTable rails={list} />
      )}
      <p className="text-small text-stone">
        Headroom with the parts in service: biased, at the rail’s usual temperature, aged; worst case over all
        corners of its conditions. Estimates from models: measure each rail before release.
      </p>
    </Page>
  );
}
