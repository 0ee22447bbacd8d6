import type { PartInService } from '@shared/schemas/checks.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { formatLength } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';

const HEAD = (
  <>
    <Th>bank line</Th>
    <Th numeric>count</Th>
    <Th numeric>C</Th>
    <Th numeric>in service</Th>
    <Th numeric>ESR</Th>
    <Th numeric>ESL</Th>
    <Th numeric>mount</Th>
    <Th numeric>rated</Th>
    <Th>side</Th>
    <Th numeric>distance</Th>
  </>
);

/** The bank as it was cut, with the parts' data of that day. */
export function BankTable({
  document,
  inService,
}: {
  document: RailDocument;
  inService: readonly PartInService[];
}) {
  if (document.bank.length === 0) return <p className="text-stone">The bank was empty.</p>;
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const lines = document.bank.map((line) => {
    const part = parts.get(line.part);
    const service = inService.find((one) => one.part === line.part);
    return { line, part, service, mount_H: line.mount_H ?? part?.mount_H };
  });
  const column = (value: (one: (typeof lines)[number]) => number | undefined, unit: UnitSymbol) => ({
    unit,
    fraction: decimalRoom(lines.map(value), unit),
  });
  const capacitance = column(({ part }) => part?.capacitance_F, 'F');
  const serving = column(({ service }) => service?.service_F, 'F');
  const esr = column(({ part }) => part?.esr_ohm, 'Ω');
  const esl = column(({ part }) => part?.esl_H, 'H');
  const mount = column(({ mount_H }) => mount_H, 'H');
  const rated = column(({ part }) => part?.rated_voltage_V, 'V');
  return (
    <Table caption={`bank of ${document.rail.name}`} head={HEAD}>
      {lines.map(({ line, part, service, mount_H }) => (
        <tr key={[line.part, line.mount_H, line.distance_m, line.side].join(' ')}>
          <Td className="min-w-52">
            {line.part}
            <span className="block text-small text-stone">
              {[part?.technology, part?.dielectric, part?.case].filter(Boolean).join(' ')}
            </span>
          </Td>
          <Td numeric className="font-semibold">
            {line.count}
          </Td>
          <Td numeric>
            <Decimal value={part?.capacitance_F} {...capacitance} />
          </Td>
          <Td numeric>
            <Decimal value={service?.service_F} {...serving} />
            {service?.estimated && <span className="block text-small text-brass">≈ estimated</span>}
          </Td>
          <Td numeric>
            <Decimal value={part?.esr_ohm} {...esr} />
          </Td>
          <Td numeric>
            <Decimal value={part?.esl_H} {...esl} />
          </Td>
          <Td numeric>
            <Decimal value={mount_H} {...mount} />
            {line.recipe && <span className="block text-small text-stone">{line.recipe}</span>}
          </Td>
          <Td numeric>
            <Decimal value={part?.rated_voltage_V} {...rated} />
          </Td>
          <Td>{line.side ?? 'top'}</Td>
          <Td numeric>{formatLength(line.distance_m)}</Td>
        </tr>
      ))}
    </Table>
  );
}
