import type { Person, SiteRole } from '@shared/schemas/person.schema';
import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/input';
import { Table, Td, Th } from '@/components/ui/table';
import { dayOf } from '@/lib/time';
import { asSiteRole, SITE_ROLES } from './site-role-words';

const HEAD = (
  <>
    <Th>person</Th>
    <Th>site role</Th>
    <Th>state</Th>
    <Th>since</Th>
    <Th>
      <span className="sr-only">what can be done</span>
    </Th>
  </>
);

function StateText({ person }: { person: Person }) {
  if (person.disabled) return <span className="whitespace-nowrap text-kingfisher">▲ disabled</span>;
  if (person.invited) return <span className="whitespace-nowrap text-brass">! invited</span>;
  return <span className="whitespace-nowrap text-reed">▽ active</span>;
}

interface Actions {
  busy: boolean;
  onRole: (person: Person, siteRole: SiteRole) => void;
  onDisabled: (person: Person, disabled: boolean) => void;
  onInviteAgain: (person: Person) => void;
}

function Row({ person, isMe, actions }: { person: Person; isMe: boolean; actions: Actions }) {
  const { busy, onRole, onDisabled, onInviteAgain } = actions;
  return (
    <tr className="hover:bg-wash/50">
      <Td className="min-w-40">
        <span className="font-semibold">{person.name}</span>
        {isMe && <span className="text-stone"> (you)</span>}
        <span className="block text-stone">{person.email}</span>
      </Td>
      <Td className="min-w-36">
        <Select
          aria-label={`site role of ${person.name}`}
          value={person.siteRole}
          disabled={busy}
          onChange={(event) => onRole(person, asSiteRole(event.target.value) ?? person.siteRole)}
        >
          {SITE_ROLES.map((role) => (
            <option key={role}>{role}</option>
          ))}
        </Select>
      </Td>
      <Td>
        <StateText person={person} />
      </Td>
      <Td className="whitespace-nowrap text-stone">{dayOf(person.createdAt)}</Td>
      <Td className="text-right whitespace-nowrap">
        {person.invited && !person.disabled && (
          <Button
            variant="plain"
            className="mr-5 py-0"
            disabled={busy}
            aria-label={`send the invitation to ${person.name} again`}
            onClick={() => onInviteAgain(person)}
          >
            Send again
          </Button>
        )}
        <Button
          variant="plain"
          className="py-0"
          disabled={busy}
          aria-label={`${person.disabled ? 'enable' : 'disable'} ${person.name}`}
          onClick={() => onDisabled(person, !person.disabled)}
        >
          {person.disabled ? 'Enable' : 'Disable'}
        </Button>
      </Td>
    </tr>
  );
}

export function PeopleTable({
  people,
  myId,
  actions,
}: {
  people: readonly Person[];
  myId: string | undefined;
  actions: Actions;
}) {
  return (
    <Table caption="people of the site" head={HEAD}>
      {people.map((person) => (
        <Row key={person.id} person={person} isMe={person.id === myId} actions={actions} />
      ))}
    </Table>
  );
}
