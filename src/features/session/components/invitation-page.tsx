import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { dayAndTime } from '@/lib/time';
import { usePageTitle } from '@/lib/use-page-title';
import { useInvitation } from '../api/invitation';
import { DoorLayout } from './door-layout';
import { InvitationForm } from './invitation-form';
import { TokenFailure } from './token-failure';

/** Where the link of an invitation leads: choose a name and a password. */
export function InvitationPage({ token, onAccepted }: { token: string; onAccepted: () => void }) {
  usePageTitle('Invitation');
  const invitation = useInvitation(token);
  if (invitation.isPending)
    return (
      <DoorLayout title="Invitation">
        <p role="status" className="text-stone">
          checking your invitation …
        </p>
      </DoorLayout>
    );
  if (invitation.isError)
    return (
      <DoorLayout title="Invitation">
        <TokenFailure error={invitation.error} what="invitation" retry={() => invitation.refetch()}>
          Ask whoever invited you to send it again. If you have accepted it already,{' '}
          <TextLink to={paths.signIn()}>sign in</TextLink>.
        </TokenFailure>
      </DoorLayout>
    );
  const { email, name, expiresAt } = invitation.data;
  return (
    <DoorLayout
      title="Welcome"
      lead={
        <>
          You are invited as {email}. Choose a password to begin; the invitation is good until{' '}
          {dayAndTime(expiresAt)}.
        </>
      }
    >
      <InvitationForm token={token} name={name} email={email} onAccepted={onAccepted} />
    </DoorLayout>
  );
}
