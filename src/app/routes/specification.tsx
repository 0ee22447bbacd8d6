import { railWithPartsSchema } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Failure } from '@/components/ui/failure';
import { Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { cacheRail, useDeleteRail, useRail, useUpdateRail } from '@/features/rails/api/rails';
import { SpecFormView } from '@/features/rails/components/spec-form';
import { formOf } from '@/features/rails/lib/spec-form-values';
import { ApiError, messageOf } from '@/lib/problem';
import { usePageTitle } from '@/lib/use-page-title';
import { ReadOnly } from '../read-only';

export function Component() {
  const { boardId = '', railId = '' } = useParams();
  const navigate = useNavigate();
  const client = useQueryClient();
  const board = useBoard(boardId);
  const rail = useRail(boardId, railId);
  const update = useUpdateRail(boardId, railId);
  const remove = useDeleteRail(boardId);
  const [removing, setRemoving] = useState(false);
  const spec = useRef<RailSpec | null>(null);
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
  const { version, spec: stored } = rail.data.rail;
  const title = `Specification of ${stored.name}`;
  if (!board.data.rights.edit) return <ReadOnly title={title} boardId={boardId} railId={railId} />;
  const back = () => navigate(paths.bench(boardId, railId));
  const save = (next: RailSpec, from: number) => {
    spec.current = next;
    update.mutate({ version: from, spec: next }, { onSuccess: back });
  };
  const conflict = newerIn(update.error);
  return (
    <Page
      title={title}
      lead="Type values as you are used to: 4u7, 0.5 nH, 3m, 35 MHz."
      actions={
        <>
          <Button variant="danger" onClick={() => setRemoving(true)}>
            Delete the rail
          </Button>
          <Button onClick={back}>Back to the bench</Button>
        </>
      }
    >
      <SpecFormView
        start={formOf(stored)}
        submitText="Save the specification"
        pending={update.isPending}
        failure={conflict ? null : update.error}
        wayOut={<ButtonLink to={paths.board(boardId)}>To the board</ButtonLink>}
        onSubmit={(next) => save(next, version)}
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
                onClick={() => spec.current && save(spec.current, conflict.rail.version)}
              >
                Save mine over it
              </Button>
              <Button
                onClick={() => {
                  cacheRail(client, conflict);
                  back();
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
              remove.mutate({ railId, version }, { onSuccess: () => navigate(paths.board(boardId)) })
            }
          >
            <span className="max-w-[24ch] truncate">Delete {stored.name}</span>
          </Button>
          <Button onClick={() => setRemoving(false)}>Keep it</Button>
        </div>
      </Dialog>
    </Page>
  );
}

/** The newer state that a refused save came back with. */
function newerIn(error: unknown) {
  if (!(error instanceof ApiError) || error.status !== 409) return null;
  const current = railWithPartsSchema.safeParse(error.problem.current);
  return current.success ? current.data : null;
}
