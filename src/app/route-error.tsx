import { useEffect } from 'react';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/config/paths';
import { messageOf, NetworkError } from '@/lib/problem';
import { createReconnect, serverAnswers } from '@/lib/reconnect';

/** A page's module that did not arrive; each browser says it in its own words. */
const NOT_FETCHED = /dynamically imported module|importing a module script/i;
const reload = () => window.location.reload();

/** Without a server a reload would leave an empty window: it waits until there is one. */
function useReloadWhenBack(isAway: boolean): void {
  useEffect(() => {
    if (!isAway) return;
    const reconnect = createReconnect({ isThere: serverAnswers, resume: reload });
    reconnect.failed(new NetworkError());
    window.addEventListener('online', reconnect.hint);
    return () => {
      reconnect.stop();
      window.removeEventListener('online', reconnect.hint);
    };
  }, [isAway]);
}

function textOf(error: unknown, isAway: boolean): string {
  if (isAway) return 'the server cannot be reached; this page loads by itself once it can';
  return isRouteErrorResponse(error) ? `${error.status} ${error.statusText}` : messageOf(error);
}

/** What is shown when a page itself fails: what happened, and two ways out. */
export function RouteError() {
  const error = useRouteError();
  const isAway = error instanceof NetworkError || (error instanceof Error && NOT_FETCHED.test(error.message));
  useReloadWhenBack(isAway);
  const again = async () => {
    if (!isAway || (await serverAnswers())) reload();
  };
  return (
    <div className="p-6">
      <Notice
        tone="error"
        title="▲ this page could not be shown"
        action={
          <div className="flex gap-3">
            <Button variant="primary" onClick={() => void again()}>
              Try again
            </Button>
            <ButtonLink to={paths.boards()}>All boards</ButtonLink>
          </div>
        }
      >
        {textOf(error, isAway)}
      </Notice>
    </div>
  );
}
