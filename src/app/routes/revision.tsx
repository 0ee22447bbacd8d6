import { useParams } from 'react-router-dom';
import { RevisionPage } from '@/features/revisions/components/revision-page';

export function Component() {
  const { boardId = '', letter = '' } = useParams();
  return <RevisionPage key={letter} boardId={boardId} letter={letter} />;
}
