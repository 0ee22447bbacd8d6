import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/config/paths';
import { messageOf } from '@/lib/problem';

/** What is shown when a page itself fails: what happened, and two ways out. */
export function RouteError() {
  const error = useRouteError();
  const message = isRouteErrorResponse(error) ? `${error.status} ${error.statusText}` : messageOf(error);
  return (
    <div className="p-6">
      <Notice
        tone="error"
        title="▲ this page could not be shown"
        action={
          <div className="flex gap-3">
            <Button variant="primary" onClick={() => window.location.reload()}>
              Load again
            </Button>
            <ButtonLink to={paths.boards()}>All boards</ButtonLink>
          </div>
        }
      >
        {message}
      </Notice>
    </div>
  );
}
