import { Button } from '@/components/ui/button';
import { Facts } from '@/components/ui/facts';
import { Failure } from '@/components/ui/failure';
import { Notice } from '@/components/ui/notice';
import { Loading, Page, Section } from '@/components/ui/page';
import { messageOf } from '@/lib/problem';
import { dayAndTime } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';
import { useSession, useSignOut } from '../api/session';
import { ChangePassword } from './change-password';
import { ThemeChoice } from './theme-choice';

export function AccountPage({ onSignedOut }: { onSignedOut: () => void }) {
  usePageTitle('Account');
  const session = useSession();
  const signOut = useSignOut();
  if (session.isPending) return <Loading what="your account" />;
  if (session.isError)
    return <Failure error={session.error} what="your account" retry={() => session.refetch()} />;
  if (!session.data) return null;
  const { person, expiresAt } = session.data;
  return (
    <Page title={person.name} narrow>
      <Section title="account">
        <Facts
          rows={[
            ['e-mail', person.email],
            ['site role', person.siteRole],
            ['signed in until', dayAndTime(expiresAt)],
          ]}
        />
        <div className="mt-4 flex flex-wrap gap-3">
          <Button
            disabled={signOut.isPending}
            onClick={() => signOut.mutate(false, { onSuccess: onSignedOut })}
          >
            Sign out
          </Button>
          <Button
            disabled={signOut.isPending}
            onClick={() => signOut.mutate(true, { onSuccess: onSignedOut })}
          >
            Sign out everywhere
          </Button>
        </div>
        {signOut.isError && (
          <Notice tone="error" className="mt-3">
            {messageOf(signOut.error)}
          </Notice>
        )}
      </Section>
      <Section title="appearance" className="border-t pt-5">
        <ThemeChoice />
      </Section>
      <Section title="password" className="border-t pt-5">
        <ChangePassword email={person.email} />
      </Section>
    </Page>
  );
}
