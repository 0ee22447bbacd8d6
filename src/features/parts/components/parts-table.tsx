import type { Part } from '@shared/schemas/part.schema';
import { Decimal } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import type { PartFilter } from '../lib/part-filter';
import { toleranceText } from '../lib/tolerance';
import { PartStateText } from './part-state';
import { SortHead } from './sort-head';

interface Props {
  parts: readonly Part[];
  filter: PartFilter;
  onSort: (sort: PartFilter['sort']) => void;
}

function Row({ part }: { part: Part }) {
  return (
    <tr className="hover:bg-wash/50">
      <Td className="whitespace-nowrap">
        <TextLink to={paths.part(part.id)}>{part.partNumber}</TextLink>
      </Td>
      <Td numeric className="font-semibold">
        <Decimal value={part.capacitance_F} unit="F" />
      </Td>
      <Td numeric>{toleranceText(part.tolerance, part.capacitance_F)}</Td>
      <Td numeric>
        <Decimal value={part.rated_voltage_V} unit="V" fraction={2} />
      </Td>
      <Td className="whitespace-nowrap">{part.dielectric || part.technology}</Td>
      <Td>{part.caseSize}</Td>
      <Td numeric>
        <Decimal value={part.esr_ohm} unit="Ω" />
      </Td>
      <Td numeric>
        <Decimal value={part.esl_H} unit="H" />
      </Td>
      <Td numeric>
        <Decimal value={part.height_mm} unit="mm" />
      </Td>
      <Td numeric>{part.unit_cost === null ? '—' : part.unit_cost.toFixed(3)}</Td>
      <Td numeric>
        <Decimal value={part.area_mm2} unit="mm²" />
      </Td>
      <Td>
        <PartStateText state={part.state} />
      </Td>
    </tr>
  );
}

export function PartsTable({ parts, filter, onSort }: Props) {
  const sortable = { filter, onSort };
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
        <Row key={part.id} part={part} />
      ))}
    </Table>
  );
}
