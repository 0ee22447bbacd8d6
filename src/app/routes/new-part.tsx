import { useNavigate } from 'react-router-dom';
import { Loading } from '@/components/ui/page';
import { paths } from '@/config/paths';
import { NewPartPage } from '@/features/parts/components/new-part-page';
import { usePartRights } from '../use-part-rights';

export function Component() {
  const navigate = useNavigate();
  const { mayAdd, isKnown } = usePartRights();
  if (!isKnown) return <Loading what="your rights" />;
  return (
    <NewPartPage
      mayAdd={mayAdd}
      onCreated={(partId) => navigate(paths.part(partId), { replace: true })}
      onCancel={() => navigate(paths.parts())}
    />
  );
}
