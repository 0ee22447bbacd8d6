import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { PeoplePage } from '@/features/people/components/people-page';
import { useSession } from '@/features/session/api/session';

export function Component() {
  const { data: session } = useSession();
  if (session?.person.siteRole !== 'admin')
    return (
      <Page title="People of the site" narrow>
        <Notice tone="note">Only administrators invite, disable or change people.</Notice>
      </Page>
    );
  return <PeoplePage myId={session.person.id} />;
}
