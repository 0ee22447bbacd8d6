import type { BoardDetail, BoardMember, BoardRole } from '@shared/schemas/board.schema';
import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { Table, Td, Th } from '@/components/ui/table';
import { messageOf } from '@/lib/problem';
import { useSetMember } from '../api/boards';
import { ROLES } from './role-words';

interface RowProps {
  member: BoardMember;
  isOwner: boolean;
  mayManage: boolean;
  busy: boolean;
  onSet: (role: BoardRole | null) => void;
}

function Row({ member: { person, role }, isOwner, mayManage, busy, onSet }: RowProps) {
  const mayChange = mayManage && !isOwner;
  return (
    <tr>
      <Td className="min-w-40">
        <span className="font-semibold">{person.name}</span>
        {person.disabled && <span className="text-brass"> ! disabled</span>}
        <span className="block text-stone">{person.email}</span>
      </Td>
      <Td className="min-w-32">
        {mayChange ? (
          <Select
            aria-label={`role of ${person.name}`}
            value={role}
            disabled={busy}
            onChange={(event) => onSet(ROLES.find((one) => one === event.target.value) ?? role)}
          >
            {ROLES.map((one) => (
              <option key={one}>{one}</option>
            ))}
          </Select>
        ) : (
          <>
            {role}
            {isOwner && <span className="text-stone">, owner</span>}
          </>
        )}
      </Td>
      {mayManage && (
        <Td className="text-right">
          {mayChange && (
            <Button
              variant="plain"
              disabled={busy}
              aria-label={`remove ${person.name} from the board`}
              onClick={() => onSet(null)}
            >
              Remove
            </Button>
          )}
        </Td>
      )}
    </tr>
  );
}

/** Who is on the board and as what; its owner changes and removes people here. */
export function MembersTable({ board }: { board: BoardDetail }) {
  const set = useSetMember(board.id);
  const mayManage = board.rights.manage;
  return (
    <div className="flex flex-col gap-3">
      {set.isError && <Notice tone="error">{messageOf(set.error)}</Notice>}
      <Table
        caption="people on this board"
        head={
          <>
            <Th>person</Th>
            <Th>role</Th>
            {mayManage && (
              <Th>
                <span className="sr-only">remove</span>
              </Th>
            )}
          </>
        }
      >
        {board.members.map((member) => (
          <Row
            key={member.person.id}
            member={member}
            isOwner={member.person.id === board.owner.id}
            mayManage={mayManage}
            busy={set.isPending}
            onSet={(role) => set.mutate({ personId: member.person.id, role })}
          />
        ))}
      </Table>
    </div>
  );
}
