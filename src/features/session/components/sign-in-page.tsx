import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { usePageTitle } from '@/lib/use-page-title';
import { DemoSignIns } from './demo-sign-ins';
import { DoorLayout } from './door-layout';
import { SignInForm } from './sign-in-form';

export function SignInPage({ onSignedIn }: { onSignedIn: () => void }) {
  usePageTitle('Sign in');
  return (
    <DoorLayout title="Sign in">
      <SignInForm onSignedIn={onSignedIn} />
      <p>
        <TextLink to={paths.forgotten()}>Forgot your password?</TextLink>
      </p>
      <DemoSignIns onSignedIn={onSignedIn} />
    </DoorLayout>
  );
}
