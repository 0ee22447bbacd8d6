import { type Person, personSchema } from '@shared/schemas/person.schema';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Facts } from '@/components/ui/facts';
import { Failure } from '@/components/ui/failure';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { EmptyState, Loading, Page, Section } from '@/components/ui/page';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { conflictOf } from '@/lib/conflict';
import { messageOf } from '@/lib/problem';
import { useDebounced } from '@/lib/use-debounced';
import { usePageTitle } from '@/lib/use-page-title';
import { useInviteAgain } from '../api/invite';
import { usePeople } from '../api/people';
import { useUpdatePerson } from '../api/update-person';
import { InviteDialog } from './invite-dialog';
import { PeopleTable } from './people-table';
import { SITE_ROLE_RIGHTS, SITE_ROLES } from './site-role-words';

/** Why a change was refused; after a change by someone else the list already shows the newer state. */
function refusal(error: unknown): string {
  const conflict = conflictOf(error, personSchema);
  return conflict
    ? `${conflict.changedBy ?? 'Someone'} changed ${conflict.current.name} meanwhile; the list shows how they stand now.`
    : messageOf(error);
}

export function PeoplePage({ myId }: { myId: string | undefined }) {
  usePageTitle('People of the site');
  const [text, setText] = useState('');
  const q = useDebounced(text.trim());
  const people = usePeople(q);
  const update = useUpdatePerson();
  const again = useInviteAgain();
  const [isInviting, setInviting] = useState(false);
  const [sentTo, setSentTo] = useState<string | null>(null);
  const [leaving, setLeaving] = useState<Person | null>(null);
  const setDisabled = ({ id, version }: Person, disabled: boolean) =>
    update.mutate({ id, version, disabled });
  const failure = update.error ?? again.error;
  return (
    <Page
      title="People of the site"
      actions={
        <Button variant="primary" onClick={() => setInviting(true)}>
          Invite a person
        </Button>
      }
    >
      <div className="max-w-xs">
        <Field label="name or e-mail">
          {(control) => (
            <Input
              {...control}
              type="search"
              value={text}
              onChange={(event) => setText(event.target.value)}
            />
          )}
        </Field>
      </div>
      {sentTo && (
        <p role="status" className="text-reed">
          ▽ {sentTo} is invited. Without a mail server the link waits on the{' '}
          <TextLink to={paths.mail()}>Mail page</TextLink>.
        </p>
      )}
      {failure && <Notice tone="error">{refusal(failure)}</Notice>}
      <div className="-mx-6 empty:hidden">
        {people.isPending && <Loading what="the people" />}
        {people.isError && <Failure error={people.error} what="the people" retry={() => people.refetch()} />}
      </div>
      {people.data?.items.length === 0 && (
        <EmptyState title={`Nobody here is called “${q}”`}>Invite them by e-mail.</EmptyState>
      )}
      {people.data && people.data.items.length > 0 && (
        <PeopleTable
          people={people.data.items}
          myId={myId}
          actions={{
            busy: update.isPending || again.isPending,
            onRole: ({ id, version }, siteRole) => update.mutate({ id, version, siteRole }),
            onDisabled: (person, disabled) => (disabled ? setLeaving(person) : setDisabled(person, disabled)),
            onInviteAgain: (person) => again.mutate(person.id, { onSuccess: () => setSentTo(person.email) }),
          }}
        />
      )}
      <Section title="what each site role may do">
        <Facts className="max-w-3xl" rows={SITE_ROLES.map((role) => [role, SITE_ROLE_RIGHTS[role]])} />
      </Section>
      <InviteDialog
        open={isInviting}
        onClose={() => setInviting(false)}
        onInvited={(email) => {
          setSentTo(email);
          setInviting(false);
        }}
      />
      <Dialog
        title={`Disable ${leaving?.name ?? ''}?`}
        open={leaving !== null}
        onClose={() => setLeaving(null)}
      >
        <p>
          They are signed out everywhere at once and cannot sign in until they are enabled again. What they
          made stays.
        </p>
        <div className="flex gap-3">
          <Button
            variant="danger"
            onClick={() => {
              if (leaving) setDisabled(leaving, true);
              setLeaving(null);
            }}
          >
            Disable
          </Button>
          <Button onClick={() => setLeaving(null)}>Cancel</Button>
        </div>
      </Dialog>
    </Page>
  );
}
