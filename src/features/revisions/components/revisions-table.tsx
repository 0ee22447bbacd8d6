import type { Revision } from '@shared/schemas/revision.schema';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { RailTally } from '@/components/ui/rail-tally';
import { Table, Td, Th } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';
import { dayAndTime } from '@/lib/time';

/** On a phone who and when stand under the note; the figures need room. */
const WIDE = 'hidden sm:table-cell';
const WIDER = 'hidden lg:table-cell';

const HEAD = (
  <>
    <Th>revision</Th>
    <Th>note</Th>
    <Th className={WIDE}>by</Th>
    <Th className={WIDE}>when</Th>
    <Th>rails</Th>
    <Th numeric className={WIDE}>
      parts
    </Th>
    <Th numeric className={WIDER}>
      cost
    </Th>
    <Th numeric className={WIDER}>
      area
    </Th>
    <Th className={WIDER}>hash</Th>
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
          <Td className="max-w-[44ch] sm:min-w-48">
            <span className="line-clamp-2 wrap-anywhere">{one.note}</span>
            <span className="block text-small text-stone sm:hidden">
              {one.createdBy.name}, {dayAndTime(one.createdAt)}
            </span>
          </Td>
          <Td className={`whitespace-nowrap ${WIDE}`}>{one.createdBy.name}</Td>
          <Td className={`whitespace-nowrap text-stone ${WIDE}`}>{dayAndTime(one.createdAt)}</Td>
          <Td>
            <RailTally rails={one.rails} inService={!one.engineVersion.startsWith('1.')} />
          </Td>
          <Td numeric className={WIDE}>
            {one.parts}
          </Td>
          <Td numeric className={WIDER}>
            {formatCost(one.cost)}
          </Td>
          <Td numeric className={WIDER}>
            <Decimal value={one.area_mm2} unit="mm²" fraction={room} />
          </Td>
          <Td className={`text-stone ${WIDER}`} title={one.hash}>
            {one.hash.slice(0, 8)}
          </Td>
        </tr>
      ))}
    </Table>
  );
}
