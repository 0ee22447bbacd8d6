import { useParams } from 'react-router-dom';
import { ButtonLink } from '@/components/ui/button';
import { Failure } from '@/components/ui/failure';
import { Loading, Page } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { useCreateRail } from '@/features/rails/api/rails';
import { SpecFormView } from '@/features/rails/components/spec-form';
import { EMPTY_SPEC } from '@/features/rails/lib/spec-form-values';
import { useLeave } from '@/lib/use-leave';
import { usePageTitle } from '@/lib/use-page-title';
import { ReadOnly } from '../read-only';

const TITLE = 'New rail';

export function Component() {
  const { boardId = '' } = useParams();
  const board = useBoard(boardId);
  const create = useCreateRail(boardId);
  const { isLeaving, leave } = useLeave();
  usePageTitle(TITLE, board.data?.name);
  if (board.isError && !board.data)
    return <Failure error={board.error} what="the board" retry={() => void board.refetch()} />;
  if (!board.data) return <Loading what="the board" />;
  if (!board.data.rights.edit) return <ReadOnly title={TITLE} boardId={boardId} />;
  return (
    <Page title={TITLE} lead="Type values as you are used to: 4u7, 0.5 nH, 3m, 35 MHz.">
      <SpecFormView
        start={EMPTY_SPEC}
        boardId={boardId}
        setup={board.data.setup}
        submitText="Make the rail"
        pending={create.isPending}
        done={isLeaving}
        failure={create.error}
        wayOut={<ButtonLink to={paths.boards()}>All boards</ButtonLink>}
        onSubmit={(spec) =>
          create.mutate(spec, { onSuccess: ({ rail }) => leave(paths.bench(boardId, rail.id)) })
        }
      />
    </Page>
  );
}
