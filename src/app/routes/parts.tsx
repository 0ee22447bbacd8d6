import { PartsPage } from '@/features/parts/components/parts-page';
import { usePartRights } from '../use-part-rights';

export function Component() {
  const { mayAdd } = usePartRights();
  return <PartsPage mayAdd={mayAdd} />;
}
