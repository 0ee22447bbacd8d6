import { useNavigate, useSearchParams } from 'react-router-dom';
import { SignInPage } from '@/features/session/components/sign-in-page';

/** Only addresses of this site are followed after signing in. */
const safeTarget = (to: string | null) => (to?.startsWith('/') && !to.startsWith('//') ? to : '/');

export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return <SignInPage onSignedIn={() => navigate(safeTarget(search.get('to')), { replace: true })} />;
}
