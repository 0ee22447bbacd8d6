import { useNavigate, useParams } from 'react-router-dom';
import { paths } from '@/config/paths';
import { InvitationPage } from '@/features/session/components/invitation-page';

export function Component() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  return <InvitationPage token={token} onAccepted={() => navigate(paths.boards(), { replace: true })} />;
}
