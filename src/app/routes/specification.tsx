import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { type RailWithParts, railWithPartsSchema } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Facts } from '@/components/ui/facts';
import { Failure } from '@/components/ui/failure';
import { Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { cacheRail, forgetRail, useDeleteRail, useRail, useUpdateRail } from '@/features/rails/api/rails';
import { SpecFormView } from '@/features/rails/components/spec-form';
import { formOf } from '@/features/rails/lib/form-of';
import { specFacts } from '@/features/revisions/components/spec-facts';
import { ApiError, messageOf } from '@/lib/problem';
import { useLeave } from '@/lib/use-leave';
import { usePageTitle } from '@/lib/use-page-title';
import { ReadOnly } from '../read-only';

export function Component() {
  const { boardId = '', railId = '' } = useParams();
  const board = useBoard(boardId);
  const rail = useRail(boardId, railId);
  usePageTitle(`Specification of ${rail.data?.rail.spec.name ?? 'a rail'}`, board.data?.name);
  if (board.isError && !board.data)
    return <Failure error={board.error} what="the board" retry={() => void board.refetch()} />;
  if (rail.isError && !rail.data)
    return (
      <Failure
        error={rail.error}
        what="the rail"
        retry={() => void rail.refetch()}
        back={{ to: paths.board(boardId), text: 'To the board' }}
      />
    );
  if (!rail.data || !board.data) return <Loading what="the rail" />;
  const { spec } = rail.data.rail;
  if (!board.data.rights.edit)
    return (
      <ReadOnly title={`Specification of ${spec.name}`} boardId={boardId} railId={railId}>
        <Facts rows={specFacts(spec)} className="max-w-3xl" />
      </ReadOnly>
    );
  return <Editor key={railId} rail={rail.data.rail} setup={board.data.setup} />;
}

function Editor({ rail, setup }: { rail: RailWithParts['rail']; setup: BoardSetup }) {
  const { boardId, id: railId } = rail;
  const navigate = useNavigate();
  const client = useQueryClient();
  const update = useUpdateRail(boardId, railId);
  const remove = useDeleteRail(boardId);
  const [removing, setRemoving] = useState(false);
  const { isLeaving, leave } = useLeave();
  const [opened] = useState(rail);
  // A specification that somebody has changed since must not be overwritten unseen; a changed bank does not stand in this form.
  const since = JSON.stringify(rail.spec) === JSON.stringify(opened.spec) ? rail : opened;
  const typed = useRef<RailSpec | null>(null);
  const bench = paths.bench(boardId, railId);
  // As long as this page shows the rail, it stays in the cache: without it, it would be asked for again.
  const isDeleted = remove.isSuccess;
  useEffect(() => {
    if (isDeleted) return () => forgetRail(client, boardId, railId);
  }, [isDeleted, client, boardId, railId]);
  const save = (next: RailSpec, from: number) => {
    typed.current = next;
    update.mutate({ version: from, spec: next }, { onSuccess: () => leave(bench) });
  };
  const conflict = newerIn(update.error);
  return (
    <Page
      title={`Specification of ${rail.spec.name}`}
      lead="Type values as you are used to: 4u7, 0.5 nH, 3m, 35 MHz."
      actions={
        <>
          <Button variant="danger" onClick={() => setRemoving(true)}>
            Delete the rail
          </Button>
          <Button onClick={() => navigate(bench)}>Back to the bench</Button>
        </>
      }
    >
      <SpecFormView
        start={formOf(opened.spec)}
        boardId={boardId}
        setup={setup}
        submitText="Save the specification"
        pending={update.isPending || remove.isPending}
        done={isLeaving}
        failure={conflict ? null : update.error}
        wayOut={<ButtonLink to={paths.board(boardId)}>To the board</ButtonLink>}
        onSubmit={(next) => save(next, since.version)}
      />
      <Dialog title="This rail has changed meanwhile" open={conflict !== null} onClose={() => update.reset()}>
        {conflict && (
          <>
            <p>
              {conflict.rail.updatedBy?.name ?? 'Somebody else'} has saved it after you opened it. What you
              typed is still in the form.
            </p>
            <div className="flex flex-wrap gap-3">
              <Button
                variant="primary"
                onClick={() => typed.current && save(typed.current, conflict.rail.version)}
              >
                Save mine over it
              </Button>
              <Button
                onClick={() => {
                  cacheRail(client, conflict);
                  leave(bench);
                }}
              >
                Keep the newer one
              </Button>
            </div>
          </>
        )}
      </Dialog>
      <Dialog title="Delete this rail?" open={removing} onClose={() => setRemoving(false)}>
        <p>Its bank goes with it. Revisions that were cut keep what they have.</p>
        {remove.isError && <p className="text-kingfisher">▲ {messageOf(remove.error)}</p>}
        <div className="flex gap-3">
          <Button
            variant="danger"
            disabled={remove.isPending}
            onClick={() =>
              remove.mutate(
                { railId, version: rail.version },
                { onSuccess: () => leave(paths.board(boardId)) },
              )
            }
          >
            <span className="max-w-[24ch] truncate">Delete {rail.spec.name}</span>
          </Button>
          <Button onClick={() => setRemoving(false)}>Keep it</Button>
        </div>
      </Dialog>
    </Page>
  );
}

/** The newer state that a refused save came back with. */
function newerIn(error: unknown): RailWithParts | null {
  if (!(error instanceof ApiError) || error.status !== 409) return null;
  const current = railWithPartsSchema.safeParse(error.problem.current);
  return current.success ? current.data : null;
}
