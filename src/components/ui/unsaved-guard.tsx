import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from './button';
import { Dialog } from './dialog';

/** While something typed is not saved, leaving the page asks first. */
export function UnsavedGuard({ dirty }: { dirty: boolean }) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => dirty && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (!dirty) return;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [dirty]);
  return (
    <Dialog
      title="Leave without saving?"
      open={blocker.state === 'blocked'}
      onClose={() => blocker.reset?.()}
    >
      <p>What you typed on this page has not been saved.</p>
      <div className="flex gap-3">
        <Button variant="primary" onClick={() => blocker.reset?.()}>
          Stay here
        </Button>
        <Button variant="danger" onClick={() => blocker.proceed?.()}>
          Leave
        </Button>
      </div>
    </Dialog>
  );
}
