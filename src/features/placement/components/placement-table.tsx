import type { Instance } from '@shared/schemas/revision.schema';
import { formatFixed } from '@shared/units/format';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';
import { type RailGroup, sharedReason } from './instance-groups';

const COLUMNS = 9;
/** Columns that a phone leaves out: it shows which part, and how far it may sit. */
const WIDE = 'max-sm:hidden';
const HEAD = (
  <>
    <Th>designator</Th>
    <Th>part</Th>
    <Th className={WIDE}>value</Th>
    <Th className={WIDE}>case</Th>
    <Th className={WIDE}>side</Th>
    <Th className={WIDE}>rail</Th>
    <Th numeric className={WIDE}>
      mount
    </Th>
    <Th numeric className={WIDE}>
      planned distance
    </Th>
    <Th className="sm:pl-6">farthest distance</Th>
  </>
);

const millimetres = (metres: number) => `${formatFixed(metres * 1000, 1)}\u00a0mm`;

function Farthest({ one, reasonIsAbove }: { one: Instance; reasonIsAbove: boolean }) {
  if (one.farthest_m === null)
    return reasonIsAbove ? (
      <span className="text-stone">none</span>
    ) : (
      <span className="text-brass">! none: {one.farthestReason ?? 'not computed'}</span>
    );
  return (
    <>
      <span className="font-semibold">{millimetres(one.farthest_m)}</span>
      {one.farthestReason && !reasonIsAbove && <span className="text-stone"> {one.farthestReason}</span>}
    </>
  );
}

function GroupHead({ group, reason }: { group: RailGroup; reason: string | null }) {
  const isNone = group.instances.every((one) => one.farthest_m === null);
  return (
    <tr>
      <th
        colSpan={COLUMNS}
        scope="rowgroup"
        className="border-b pt-5 pb-1 text-left font-semibold wrap-anywhere"
      >
        {group.rail}
        <span className="font-normal text-stone">
          {' '}
          {group.instances.length} {group.instances.length === 1 ? 'part' : 'parts'}
        </span>
        {reason &&
          (isNone ? (
            <span className="font-normal text-brass"> · ! no farthest distance: {reason}</span>
          ) : (
            <span className="font-normal text-stone"> · {reason}</span>
          ))}
      </th>
    </tr>
  );
}

function Row({ one, reasonIsAbove, room }: { one: Instance; reasonIsAbove: boolean; room: number }) {
  return (
    <tr className="hover:bg-wash/50">
      <Td className="font-semibold">{one.designator}</Td>
      <Td className="sm:whitespace-nowrap">
        {one.partNumber}
        <span className="block text-small text-stone sm:hidden">
          {[one.value, one.caseSize, one.side].filter(Boolean).join(' · ')}
        </span>
      </Td>
      <Td className={`${WIDE} whitespace-nowrap`}>{one.value}</Td>
      <Td className={WIDE}>{one.caseSize || '—'}</Td>
      <Td className={WIDE}>{one.side}</Td>
      <Td className={`${WIDE} max-w-[20ch] truncate text-stone`} title={one.rail}>
        {one.rail}
      </Td>
      <Td numeric className={WIDE}>
        <Decimal value={one.mount_H} unit="H" fraction={room} />
        {one.recipe && <span className="block text-small text-stone">{one.recipe}</span>}
      </Td>
      <Td numeric className={WIDE}>
        {one.distance_m === null ? (
          <span className="text-stone">not planned</span>
        ) : (
          millimetres(one.distance_m)
        )}
      </Td>
      <Td className="sm:min-w-36 sm:pl-6">
        <Farthest one={one} reasonIsAbove={reasonIsAbove} />
      </Td>
    </tr>
  );
}

function Group({ group, room }: { group: RailGroup; room: number }) {
  const reason = sharedReason(group);
  return (
    <>
      <GroupHead group={group} reason={reason} />
      {group.instances.map((one) => (
        <Row key={one.designator} one={one} reasonIsAbove={reason !== null} room={room} />
      ))}
    </>
  );
}

/** One row a capacitor, under the rail it belongs to. */
export function PlacementTable({ groups }: { groups: readonly RailGroup[] }) {
  const room = decimalRoom(
    groups.flatMap((group) => group.instances.map((one) => one.mount_H)),
    'H',
  );
  return (
    <Table caption="placement list by rail" head={HEAD}>
      {groups.map((group) => (
        <Group key={group.railId} group={group} room={room} />
      ))}
    </Table>
  );
}
