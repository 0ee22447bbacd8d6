import { useParams } from 'react-router-dom';
import { ResetPage } from '@/features/session/components/reset-page';

export function Component() {
  const { token = '' } = useParams();
  return <ResetPage token={token} />;
}
