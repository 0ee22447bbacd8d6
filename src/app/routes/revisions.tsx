import { useNavigate, useParams } from 'react-router-dom';
import { Failure } from '@/components/ui/failure';
import { Loading } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { useBoard } from '@/features/boards/api/boards';
import { useRails } from '@/features/rails/api/rails';
import { RevisionsPage } from '@/features/revisions/components/revisions-page';

export function Component() {
  const { boardId = '' } = useParams();
  const navigate = useNavigate();
  const board = useBoard(boardId);
  const rails = useRails(boardId);
  if (board.isError) return <Failure error={board.error} what="the board" retry={() => board.refetch()} />;
  if (rails.isError) return <Failure error={rails.error} what="the rails" retry={() => rails.refetch()} />;
  if (board.isPending || rails.isPending) return <Loading what="the board" />;
  return (
    <RevisionsPage
      board={board.data}
      rails={rails.data}
      onCut={(letter) => navigate(paths.revision(boardId, letter))}
    />
  );
}
