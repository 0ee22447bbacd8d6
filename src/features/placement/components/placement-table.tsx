import type { Instance } from '@shared/schemas/revision.schema';
import { formatFixed } from '@shared/units/format';
import { Decimal } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';
import type { RailGroup } from './instance-groups';

const COLUMNS = 9;
const HEAD = (
  <>
    <Th>designator</Th>
    <Th>part</Th>
    <Th>value</Th>
    <Th>case</Th>
    <Th>side</Th>
    <Th>rail</Th>
    <Th numeric>mount</Th>
    <Th numeric>planned distance</Th>
    <Th>farthest distance</Th>
  </>
);

const millimetres = (metres: number) => `${formatFixed(metres * 1000, 1)}\u00a0mm`;

function Farthest({ one }: { one: Instance }) {
  if (one.farthest_m === null)
    return <span className="text-brass">! none: {one.farthestReason ?? 'not computed'}</span>;
  return (
    <>
      <span className="font-semibold">{millimetres(one.farthest_m)}</span>
      {one.farthestReason && <span className="text-stone"> {one.farthestReason}</span>}
    </>
  );
}

function Group({ group }: { group: RailGroup }) {
  return (
    <>
      <tr>
        <th colSpan={COLUMNS} scope="rowgroup" className="border-b pt-5 pb-1 text-left font-semibold">
          {group.rail}
          <span className="font-normal text-stone">
            {' '}
            {group.instances.length} {group.instances.length === 1 ? 'part' : 'parts'}
          </span>
        </th>
      </tr>
      {group.instances.map((one) => (
        <tr key={one.designator} className="hover:bg-wash/50">
          <Td className="font-semibold">{one.designator}</Td>
          <Td className="whitespace-nowrap">{one.partNumber}</Td>
          <Td className="whitespace-nowrap">{one.value}</Td>
          <Td>{one.caseSize || '—'}</Td>
          <Td>{one.side}</Td>
          <Td className="whitespace-nowrap text-stone">{one.rail}</Td>
          <Td numeric>
            <Decimal value={one.mount_H} unit="H" />
          </Td>
          <Td numeric>
            {one.distance_m === null ? (
              <span className="text-stone">not planned</span>
            ) : (
              millimetres(one.distance_m)
            )}
          </Td>
          <Td className="min-w-48">
            <Farthest one={one} />
          </Td>
        </tr>
      ))}
    </>
  );
}

/** One row a capacitor, under the rail it belongs to. */
export function PlacementTable({ groups }: { groups: readonly RailGroup[] }) {
  return (
    <Table caption="placement list by rail" head={HEAD}>
      {groups.map((group) => (
        <Group key={group.railId} group={group} />
      ))}
    </Table>
  );
}
