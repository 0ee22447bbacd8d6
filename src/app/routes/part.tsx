import { useParams } from 'react-router-dom';
import { PartPage } from '@/features/parts/components/part-page';
import { usePartRights } from '../use-part-rights';

export function Component() {
  const { partId = '' } = useParams();
  return <PartPage key={partId} partId={partId} {...usePartRights()} />;
}
