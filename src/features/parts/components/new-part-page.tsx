import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { ApiError, messageOf } from '@/lib/problem';
import { usePageTitle } from '@/lib/use-page-title';
import { useCreatePart } from '../api/create-part';
import { EMPTY_PART } from '../lib/part-form.schema';
import { PartForm } from './part-form';

interface Props {
  mayAdd: boolean;
  onCreated: (partId: string) => void;
  onCancel: () => void;
}

export function NewPartPage({ mayAdd, onCreated, onCancel }: Props) {
  usePageTitle('New part');
  const create = useCreatePart();
  const isAtField = create.error instanceof ApiError && create.error.problem.errors !== undefined;
  return (
    <Page
      title="New part"
      lead="It begins as a draft; a librarian approves it. Type values as you are used to: 4u7, 100n, 12m, 0.5 nH."
    >
      {mayAdd ? (
        <PartForm
          initial={EMPTY_PART}
          label="Add the draft"
          busy={create.isPending}
          save={(fields) => create.mutateAsync(fields).then((part) => onCreated(part.id))}
          onCancel={onCancel}
        >
          {create.isError && !isAtField && <Notice tone="error">{messageOf(create.error)}</Notice>}
        </PartForm>
      ) : (
        <Notice tone="note">
          Parts are added by librarians, administrators, and engineers of a board. Ask one of them.
        </Notice>
      )}
    </Page>
  );
}
