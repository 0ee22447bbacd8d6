import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { onSessionExpired } from '@/lib/session-expired';
import { useSession } from '../api/session';
import { SignInForm } from './sign-in-form';

/** When the session ends under one's hands: sign in again right here, and go on with what was typed. */
export function SessionKeeper() {
  const client = useQueryClient();
  const { data: session } = useSession();
  const [expired, setExpired] = useState(false);
  useEffect(() => onSessionExpired(() => setExpired(true)), []);
  return (
    <Dialog title="Your session has ended" open={expired} onClose={() => setExpired(false)} firm>
      <p className="text-stone">Sign in again to go on where you are. Nothing you typed is lost.</p>
      <SignInForm
        email={session?.person.email}
        onSignedIn={() => {
          setExpired(false);
          window.dispatchEvent(new Event('millpond:signed-in'));
          void client.invalidateQueries();
        }}
      />
    </Dialog>
  );
}
