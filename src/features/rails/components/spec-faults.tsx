import type { ReactNode } from 'react';
import { Notice } from '@/components/ui/notice';
import { isGone, messageOf } from '@/lib/problem';
import type { SpecErrors } from '../lib/spec-form';

interface Props {
  /** What the form found itself, and what the server did. */
  own: SpecErrors;
  theirs: SpecErrors;
  failure: unknown;
  wayOut?: ReactNode;
}

/** Above the button: how many fields need another look, or why the server did not save. */
export function SpecFaults({ own, theirs, failure, wayOut }: Props) {
  const count = Object.keys(own).length;
  const hasFailed = failure !== null && failure !== undefined;
  const isAtFields = Object.keys(theirs).some((key) => key !== 'form');
  return (
    <>
      {count > 0 && (
        <p role="alert" className="text-kingfisher">
          ▲ {own.form ?? `${count} ${count === 1 ? 'field needs' : 'fields need'} another look`}
        </p>
      )}
      {hasFailed && !isAtFields && (
        <Notice tone="error" title="▲ not saved" action={isGone(failure) && wayOut}>
          {messageOf(failure)}
        </Notice>
      )}
    </>
  );
}
