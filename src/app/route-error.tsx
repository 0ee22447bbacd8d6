import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button, ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/config/paths';
import { messageOf, NetworkError } from '@/lib/problem';

/** A page's module that did not arrive; each browser says it in its own words. */
const NOT_FETCHED = /dynamically imported module|importing a module script/i;

function textOf(error: unknown): string {
  if (isRouteErrorResponse(error)) return `${error.status} ${error.statusText}`;
  if (error instanceof Error && NOT_FETCHED.test(error.message)) return messageOf(new NetworkError());
  return messageOf(error);
}

/** What is shown when a page itself fails: what happened, and two ways out. */
export function RouteError() {
  const error = useRouteError();
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
        {textOf(error)}
      </Notice>
    </div>
  );
}
