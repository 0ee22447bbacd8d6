import { paths } from '@/config/paths';
import { isGone, messageOf, NetworkError } from '@/lib/problem';
import { Button, ButtonLink } from './button';
import { Notice } from './notice';

interface Props {
  error: unknown;
  what: string;
  retry?: () => void;
  /** Where to go when it is not there (any more), besides the list of boards. */
  back?: { to: string; text: string };
}

/** A query that failed: what went wrong and a way on. What is not there is not there a second time either. */
export function Failure({ error, what, retry, back }: Props) {
  const gone = isGone(error);
  return (
    <div className="px-6 py-6">
      <Notice
        tone="error"
        title={gone ? `▲ ${what} is not here` : `▲ ${what} could not be fetched`}
        action={
          gone ? (
            <div className="flex flex-wrap gap-3">
              {back && (
                <ButtonLink to={back.to} variant="primary">
                  {back.text}
                </ButtonLink>
              )}
              <ButtonLink to={paths.boards()}>All boards</ButtonLink>
            </div>
          ) : (
            retry && <Button onClick={retry}>Try again</Button>
          )
        }
      >
        {messageOf(error)}
        {error instanceof NetworkError && '; this page loads by itself once it can'}
        {gone && ' It has been deleted, or it is not open to you.'}
      </Notice>
    </div>
  );
}
