import { useNavigate, useParams } from 'react-router-dom';
import { paths } from '@/config/paths';
import { BoardPeoplePage } from '@/features/boards/components/board-people-page';

export function Component() {
  const { boardId = '' } = useParams();
  const navigate = useNavigate();
  return (
    <BoardPeoplePage
      key={boardId}
      boardId={boardId}
      onDeleted={() => navigate(paths.boards(), { replace: true })}
    />
  );
}
