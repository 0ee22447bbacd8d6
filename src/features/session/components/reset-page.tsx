import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { usePageTitle } from '@/lib/use-page-title';
import { useReset, useSetPassword } from '../api/reset';
import { DoorLayout } from './door-layout';
import { ResetForm } from './reset-form';
import { TokenFailure } from './token-failure';

/** Where the link of a reset leads: choose a new password. */
export function ResetPage({ token }: { token: string }) {
  usePageTitle('New password');
  const reset = useReset(token);
  const save = useSetPassword(token);
  if (save.isSuccess)
    return (
      <DoorLayout title="Your new password is set" lead="You were signed out everywhere else.">
        <p>
          <TextLink to={paths.signIn()}>Sign in with it</TextLink>
        </p>
      </DoorLayout>
    );
  if (reset.isPending)
    return (
      <DoorLayout title="New password">
        <p role="status" className="text-stone">
          checking your link …
        </p>
      </DoorLayout>
    );
  const failure = reset.error ?? save.error;
  return (
    <DoorLayout title="New password" lead={reset.data && `For ${reset.data.email}.`}>
      {reset.data && <ResetForm save={save} email={reset.data.email} />}
      {failure && (
        <TokenFailure error={failure} what="link" retry={reset.isError ? () => reset.refetch() : undefined}>
          <TextLink to={paths.forgotten()}>Ask for a new link</TextLink>
        </TokenFailure>
      )}
    </DoorLayout>
  );
}
