import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { ApiError, messageOf } from '@/lib/problem';

interface Props {
  error: unknown;
  /** What the link was for, e.g. “invitation”. */
  what: string;
  /** What to do when the link is of no use any more. */
  children: ReactNode;
  retry?: () => void;
}

/** A link from a mail that does not work: used, expired, cut short; or only the network that failed. */
export function TokenFailure({ error, what, children, retry }: Props) {
  const isSpent = error instanceof ApiError && (error.status === 404 || error.status === 410);
  if (!isSpent)
    return (
      <Notice
        tone="error"
        title={`▲ the ${what} could not be checked`}
        action={retry && <Button onClick={retry}>Try again</Button>}
      >
        {messageOf(error)}
      </Notice>
    );
  return (
    <Notice tone="error" title={`▲ this ${what} cannot be used`}>
      <p>It has been used already, has expired, or the address was cut short.</p>
      <div className="mt-2">{children}</div>
    </Notice>
  );
}
