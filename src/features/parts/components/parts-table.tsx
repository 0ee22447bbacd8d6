import type { Part } from '@shared/schemas/part.schema';
import { useMemo } from 'react';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';
import type { PartFilter } from '../lib/part-filter';
import { TOLERANCES } from '../lib/tolerance';
import { PartStateText } from './part-state';
import { SortHead } from './sort-head';

interface Props {
  parts: readonly Part[];
  filter: PartFilter;
  onSort: (sort: PartFilter['sort']) => void;
}

/** What each column of figures needs behind its decimal points. */
const roomsOf = (parts: readonly Part[]) => ({
  capacitance: decimalRoom(
    parts.map((part) => part.capacitance_F),
    'F',
  ),
  voltage: decimalRoom(
    parts.map((part) => part.rated_voltage_V),
    'V',
  ),
  esr: decimalRoom(
    parts.map((part) => part.esr_ohm),
    'Ω',
  ),
  esl: decimalRoom(
    parts.map((part) => part.esl_H),
    'H',
  ),
  height: decimalRoom(
    parts.map((part) => part.height_mm),
    'mm',
  ),
  area: decimalRoom(
    parts.map((part) => part.area_mm2),
    'mm²',
  ),
});

function Row({ part, rooms }: { part: Part; rooms: ReturnType<typeof roomsOf> }) {
  return (
    <tr className="hover:bg-wash/50">
      <Td className="whitespace-nowrap">
        <TextLink to={paths.part(part.id)}>{part.partNumber}</TextLink>
      </Td>
      <Td numeric className="font-semibold">
        <Decimal value={part.capacitance_F} unit="F" fraction={rooms.capacitance} />
      </Td>
      <Td numeric>{TOLERANCES[part.tolerance]}</Td>
      <Td numeric>
        <Decimal value={part.rated_voltage_V} unit="V" fraction={rooms.voltage} />
      </Td>
      <Td className="whitespace-nowrap">{part.dielectric || part.technology}</Td>
      <Td>{part.caseSize}</Td>
      <Td numeric>
        <Decimal value={part.esr_ohm} unit="Ω" fraction={rooms.esr} />
      </Td>
      <Td numeric>
        <Decimal value={part.esl_H} unit="H" fraction={rooms.esl} />
      </Td>
      <Td numeric>
        <Decimal value={part.height_mm} unit="mm" fraction={rooms.height} />
      </Td>
      <Td numeric>{formatCost(part.unit_cost, 3)}</Td>
      <Td numeric>
        <Decimal value={part.area_mm2} unit="mm²" fraction={rooms.area} />
      </Td>
      <Td>
        <PartStateText state={part.state} />
      </Td>
    </tr>
  );
}

export function PartsTable({ parts, filter, onSort }: Props) {
  const sortable = { filter, onSort };
  const rooms = useMemo(() => roomsOf(parts), [parts]);
  return (
    <Table
      caption="parts"
      head={
        <>
          <SortHead {...sortable} label="part number" sort="partNumber" />
          <SortHead {...sortable} label="C" sort="capacitance_F" numeric />
          <Th numeric>tolerance</Th>
          <SortHead {...sortable} label="rated" sort="rated_voltage_V" numeric />
          <SortHead {...sortable} label="dielectric" sort="dielectric" />
          <SortHead {...sortable} label="case" sort="caseSize" />
          <SortHead {...sortable} label="ESR" sort="esr_ohm" numeric />
          <SortHead {...sortable} label="ESL" sort="esl_H" numeric />
          <Th numeric>height</Th>
          <SortHead {...sortable} label="price" sort="unit_cost" numeric />
          <SortHead {...sortable} label="area" sort="area_mm2" numeric />
          <SortHead {...sortable} label="state" sort="state" />
        </>
      }
    >
      {parts.map((part) => (
        <Row key={part.id} part={part} rooms={rooms} />
      ))}
    </Table>
  );
}
