import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { formatLength, formatQuantity } from '@shared/units/format';
import { Decimal } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';

const HEAD = (
  <>
    <Th>bank line</Th>
    <Th numeric>count</Th>
    <Th numeric>C</Th>
    <Th numeric>ESR</Th>
    <Th numeric>ESL</Th>
    <Th numeric>mount</Th>
    <Th numeric>rated</Th>
    <Th>side</Th>
    <Th numeric>distance</Th>
  </>
);

/** The bank as it was cut, with the parts' data of that day. */
export function BankTable({ document }: { document: RailDocument }) {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  if (document.bank.length === 0) return <p className="text-stone">The bank was empty.</p>;
  return (
    <Table caption={`bank of ${document.rail.name}`} head={HEAD}>
      {document.bank.map((line) => {
        const part = parts.get(line.part);
        return (
          <tr key={[line.part, line.mount_H, line.distance_m, line.side].join(' ')}>
            <Td className="min-w-52">
              {line.part}
              {part && (
                <span className="block text-small text-stone">
                  {[
                    formatQuantity(part.capacitance_F, 'F', { trim: true }),
                    part.dielectric || part.technology,
                    part.case,
                  ]
                    .filter(Boolean)
                    .join(' ')}
                </span>
              )}
            </Td>
            <Td numeric className="font-semibold">
              {line.count}
            </Td>
            <Td numeric>
              <Decimal value={part?.capacitance_F} unit="F" />
            </Td>
            <Td numeric>
              <Decimal value={part?.esr_ohm} unit="Ω" />
            </Td>
            <Td numeric>
              <Decimal value={part?.esl_H} unit="H" />
            </Td>
            <Td numeric>
              <Decimal value={line.mount_H ?? part?.mount_H} unit="H" />
            </Td>
            <Td numeric>
              <Decimal value={part?.rated_voltage_V} unit="V" />
            </Td>
            <Td>{line.side ?? 'top'}</Td>
            <Td numeric>{formatLength(line.distance_m)}</Td>
          </tr>
        );
      })}
    </Table>
  );
}
