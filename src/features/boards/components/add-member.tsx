import type { BoardDetail, BoardRole } from '@shared/schemas/board.schema';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input, Select } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { messageOf } from '@/lib/problem';
import { useDebounced } from '@/lib/use-debounced';
import { useSetMember } from '../api/boards';
import { usePeopleSearch } from '../api/people-search';
import { ROLES } from './role-words';

/** Finds people of the site by name or address and puts them on the board. */
export function AddMember({ board }: { board: BoardDetail }) {
  const [text, setText] = useState('');
  const [role, setRole] = useState<BoardRole>('engineer');
  const q = useDebounced(text.trim());
  const found = usePeopleSearch(q);
  const add = useSetMember(board.id);
  const isOn = new Set(board.members.map(({ person }) => person.id));
  const choices = q === '' ? [] : (found.data?.items ?? []).filter((person) => !person.disabled);
  return (
    <div className="flex max-w-xl flex-col gap-3">
      <div className="grid grid-cols-[minmax(0,1fr)_9rem] gap-3">
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
        <Field label="to be added as">
          {(control) => (
            <Select
              {...control}
              value={role}
              onChange={(event) => setRole(ROLES.find((one) => one === event.target.value) ?? role)}
            >
              {ROLES.map((one) => (
                <option key={one}>{one}</option>
              ))}
            </Select>
          )}
        </Field>
      </div>
      {found.isError && <Notice tone="error">{messageOf(found.error)}</Notice>}
      {add.isError && <Notice tone="error">{messageOf(add.error)}</Notice>}
      <div aria-live="polite">
        {q !== '' && found.isSuccess && choices.length === 0 && (
          <p className="text-stone">
            Nobody here is called “{q}”. An administrator can invite people to the site.
          </p>
        )}
        <ul>
          {choices.map((person) => (
            <li key={person.id} className="flex items-baseline justify-between gap-4 border-b py-1.5">
              <span className="min-w-0">
                <span className="font-semibold">{person.name}</span>{' '}
                <span className="break-all text-stone">{person.email}</span>
                {person.invited && <span className="text-stone"> · invited</span>}
              </span>
              {isOn.has(person.id) ? (
                <span className="whitespace-nowrap text-stone">on the board</span>
              ) : (
                <Button
                  variant="plain"
                  className="py-0"
                  disabled={add.isPending}
                  aria-label={`add ${person.name} as ${role}`}
                  onClick={() => add.mutate({ personId: person.id, role })}
                >
                  Add as {role}
                </Button>
              )}
            </li>
          ))}
        </ul>
      </div>
    </div>
  );
}
