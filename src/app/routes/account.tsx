import { useNavigate } from 'react-router-dom';
import { paths } from '@/config/paths';
import { AccountPage } from '@/features/session/components/account-page';

export function Component() {
  const navigate = useNavigate();
  return <AccountPage onSignedOut={() => navigate(paths.signIn(), { replace: true })} />;
}
