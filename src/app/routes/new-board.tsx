import { useNavigate } from 'react-router-dom';
import { paths } from '@/config/paths';
import { NewBoardPage } from '@/features/boards/components/new-board-page';

export function Component() {
  const navigate = useNavigate();
  return <NewBoardPage onCreated={(boardId) => navigate(paths.board(boardId), { replace: true })} />;
}
