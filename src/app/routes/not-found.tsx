import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { paths } from '@/config/paths';

export function Component() {
  return (
    <Page title="Nothing is here">
      <p className="text-stone">The page does not exist, or you are not on the board it belongs to.</p>
      <div>
        <ButtonLink to={paths.boards()}>All boards</ButtonLink>
      </div>
    </Page>
  );
}
