import type { Revision } from '@shared/schemas/revision.schema';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { RailTally } from '@/components/ui/rail-tally';
import { Table, Td, Th } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';
import { dayAndTime } from '@/lib/time';

const HEAD = (
  <>
    <Th>revision</Th>
    <Th>note</Th>
    <Th>by</Th>
    <Th>when</Th>
    <Th>rails</Th>
    <Th numeric>parts</Th>
    <Th numeric>cost</Th>
    <Th numeric>area</Th>
    <Th>hash</Th>
  </>
);

/** The revisions of a board, newest first. */
export function RevisionsTable({ boardId, revisions }: { boardId: string; revisions: readonly Revision[] }) {
  const room = decimalRoom(
    revisions.map((one) => one.area_mm2),
    'mm²',
  );
  return (
    <Table caption="revisions, newest first" head={HEAD}>
      {revisions.map((one) => (
        <tr key={one.id} className="hover:bg-wash/50">
          <Td>
            <TextLink
              to={paths.revision(boardId, one.letter)}
              className="font-bold"
              aria-label={`revision ${one.letter}`}
            >
              {one.letter}
            </TextLink>
          </Td>
          <Td className="min-w-48 max-w-[44ch]">
            <span className="line-clamp-2">{one.note}</span>
          </Td>
          <Td className="whitespace-nowrap">{one.createdBy.name}</Td>
          <Td className="whitespace-nowrap text-stone">{dayAndTime(one.createdAt)}</Td>
          <Td>
            <RailTally rails={one.rails} />
          </Td>
          <Td numeric>{one.parts}</Td>
          <Td numeric>{formatCost(one.cost)}</Td>
          <Td numeric>
            <Decimal value={one.area_mm2} unit="mm²" fraction={room} />
          </Td>
          <Td className="text-stone" title={one.hash}>
            {one.hash.slice(0, 8)}
          </Td>
        </tr>
      ))}
    </Table>
  );
}
