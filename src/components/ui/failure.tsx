import { messageOf } from '@/lib/problem';
import { Button } from './button';
import { Notice } from './notice';

/** A query that failed: what went wrong and a way to try again. */
export function Failure({ error, what, retry }: { error: unknown; what: string; retry?: () => void }) {
  return (
    <div className="px-6 py-6">
      <Notice
        tone="error"
        title={`▲ ${what} could not be fetched`}
        action={retry && <Button onClick={retry}>Try again</Button>}
      >
        {messageOf(error)}
      </Notice>
    </div>
  );
}
